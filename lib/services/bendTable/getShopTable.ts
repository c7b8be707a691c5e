import { loadValues } from "./loadValues";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { database } from "@/db/client";

/** What the editor computes a part's flat with while it is typed. */
export async function getShopTable(material: string): Promise<ShopTable> {
  return loadValues(database(), material);
}
