import { isConnectionLost } from "@/db/isConnectionLost";
import { databaseLostDigest } from "./databaseLostDigest";

/** What a page asks of the database; when it cannot be reached, the page says that and not that something went wrong. */
export async function orDatabaseLost<T>(asked: Promise<T>): Promise<T> {
  return asked.catch((thrown: unknown) => {
    if (!isConnectionLost(thrown)) throw thrown;
    throw Object.assign(new Error("The database cannot be reached."), { digest: databaseLostDigest });
  });
}
