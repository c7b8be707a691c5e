import { materialLookup } from "../materialLookup";
import type { MaterialLookup } from "@/bending/handbook/material";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { shopTable } from "@/bending/shopTable/shopTable";
import { bendTrialFromRow } from "@/db/bendTrials/bendTrialFromRow";
import { findAllTrials } from "@/db/bendTrials/findAllTrials";
import type { TrialRow } from "@/db/bendTrials/trialRow";
import type { Connection } from "@/db/connection";

export interface LoadedShopTable {
  /** In the order of their numbers; withdrawn ones are left out. */
  readonly trials: readonly TrialRow[];
  readonly table: ShopTable;
  readonly materials: MaterialLookup;
}

/** The shop's measured values as they stand now, of one material or of all. */
export async function loadShopTable(db: Connection, material?: string): Promise<LoadedShopTable> {
  const [materials, trials] = await Promise.all([materialLookup(db), findAllTrials(db, { material })]);
  return { trials, table: shopTable(trials.map(bendTrialFromRow), materials), materials };
}
