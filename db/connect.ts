import knex, { type Knex } from "knex";

/** Opens a pool on a PostgreSQL address. Numbers that fit a double come back as numbers, times as `Date`. */
export function connect(url: string, most = 10): Knex {
  return knex({
    client: "pg",
    connection: { connectionString: url, application_name: "foldwright", connectionTimeoutMillis: 5000 },
    pool: { min: 0, max: most },
    acquireConnectionTimeout: 5000,
  });
}
