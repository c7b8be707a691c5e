import { flatChangeOf } from "./flatChangeOf";
import { loadShopNow } from "./loadShopNow";
import type { Connection } from "@/db/connection";
import { findStoredFlats } from "@/db/parts/findStoredFlats";
import type { FlatChange } from "@/lib/schemas/views";

/** By part: how the flat stored with its newest revision (or with the one named) would come out now, where it would be another. */
export async function partFlatChanges(db: Connection, which: Parameters<typeof findStoredFlats>[1]): Promise<ReadonlyMap<string, FlatChange>> {
  const rows = await findStoredFlats(db, which);
  if (rows.length === 0) return new Map();
  const shop = await loadShopNow(db, rows.map((row) => row.document.material));
  return new Map(rows.flatMap((row): [string, FlatChange][] => {
    const change = flatChangeOf({ document: row.document, size: [row.flat_width_mm, row.flat_depth_mm], since: row.saved_at }, shop);
    return change === null ? [] : [[row.part_id, change]];
  }));
}
