import type { Knex } from "knex";
import { migrationConfig } from "./db/migrationConfig";

/** For the knex command line (`npx tsx node_modules/knex/bin/cli.js migrate:status`); the application's own client stands in db/. */
const config: Knex.Config = {
  client: "pg",
  connection: process.env.DATABASE_URL ?? "",
  pool: { min: 0, max: 2 },
  migrations: migrationConfig,
};

export default config;
