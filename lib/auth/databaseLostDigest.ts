/** `error.digest` of a page that could not be made because the database cannot be reached. */
export const databaseLostDigest = "database-lost";
