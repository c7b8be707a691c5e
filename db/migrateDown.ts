import type { Knex } from "knex";
import { migrationConfig } from "./migrationConfig";

/** Takes every migration back, newest first; the data goes with it. */
export async function migrateDown(db: Knex): Promise<void> {
  await db.migrate.rollback(migrationConfig, true);
}
