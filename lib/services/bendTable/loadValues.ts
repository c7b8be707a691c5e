import { loadShopTable } from "./loadShopTable";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { valuesOf } from "@/bending/shopTable/valuesOf";
import type { Connection } from "@/db/connection";

/** The shop's measured values of a material as they stand now; nothing measured: no cells. */
export async function loadValues(db: Connection, material: string): Promise<ShopTable> {
  return valuesOf((await loadShopTable(db, material)).table, material);
}
