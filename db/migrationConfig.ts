import type { Knex } from "knex";
import { migrationList, type Migration } from "./migrationList";

/** Migrations are imported rather than found on disk, so that they run the same under tsx, a bundler and the tests. */
export const migrationConfig: Knex.MigratorConfig = {
  migrationSource: {
    getMigrations: async () => [...migrationList],
    getMigrationName: (migration: Migration) => migration.name,
    getMigration: async (migration: Migration) => ({ up: migration.up, down: migration.down }),
  },
};
