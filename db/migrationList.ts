import type { Knex } from "knex";
import * as access from "./migrations/001_access";
import * as shop from "./migrations/002_shop";
import * as materials from "./migrations/003_materials";
import * as bendTrials from "./migrations/004_bend_trials";
import * as planOrigin from "./migrations/005_plan_origin";
import * as hemDies from "./migrations/007_hem_dies";

export interface Migration {
  /** The file's name, so that the knex command line and the application agree on what has run. */
  readonly name: string;
  readonly up: (db: Knex) => Promise<void>;
  readonly down: (db: Knex) => Promise<void>;
}

/** In order; a name stays as it is once it has run anywhere. */
export const migrationList: readonly Migration[] = [
  { name: "001_access.ts", up: access.up, down: access.down },
  { name: "002_shop.ts", up: shop.up, down: shop.down },
  { name: "003_materials.ts", up: materials.up, down: materials.down },
  { name: "004_bend_trials.ts", up: bendTrials.up, down: bendTrials.down },
  { name: "005_plan_origin.ts", up: planOrigin.up, down: planOrigin.down },
  { name: "007_hem_dies.ts", up: hemDies.up, down: hemDies.down },
];
