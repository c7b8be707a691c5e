import type { Knex } from "knex";
import { migrationConfig } from "./migrationConfig";

/** Brings the database up to date; answers the names of the migrations that ran. */
export async function migrateLatest(db: Knex): Promise<readonly string[]> {
  const [, names] = (await db.migrate.latest(migrationConfig)) as [number, readonly string[]];
  return names;
}
