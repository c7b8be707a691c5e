import { loadShopTable } from "../bendTable/loadShopTable";
import type { MaterialLookup } from "@/bending/handbook/material";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import type { Connection } from "@/db/connection";

/** What a part document is checked and computed with: the shop's materials, and its measured values of the document's own. */
export async function shopOf(db: Connection, json: unknown): Promise<{ readonly materials: MaterialLookup; readonly table: ShopTable }> {
  const named = typeof json === "object" && json !== null && "material" in json && typeof json.material === "string" ? json.material : undefined;
  return loadShopTable(db, named);
}
