import { flatChangeOf } from "./flatChangeOf";
import { loadShopNow, type ShopNow } from "./loadShopNow";
import { mm, mmPer } from "@/bending/core/units";
import { naturalRadius } from "@/bending/handbook/naturalRadius";
import type { BendContext } from "@/bending/part/bendContext";
import type { Connection } from "@/db/connection";
import { findSheetFlats, type SheetFlatRow } from "@/db/sheets/findSheetFlats";
import type { FlatChange } from "@/lib/schemas/views";

/** By sheet, released ones alone: how its flat would come out now on the dies that it names. The sheet itself stays as it was released. */
export async function sheetFlatChanges(db: Connection, ids: readonly string[]): Promise<ReadonlyMap<string, FlatChange>> {
  const rows = await findSheetFlats(db, ids);
  if (rows.length === 0) return new Map();
  const shop = await loadShopNow(db, rows.map((row) => row.part_document.material));
  return new Map(rows.flatMap((row): [string, FlatChange][] => {
    const per = mmPer(row.units);
    const change = flatChangeOf({ document: row.part_document, size: [row.flat.width * per, row.flat.depth * per], since: row.planned_at, context: asPlanned(row, shop) }, shop);
    return change === null ? [] : [[row.id, change]];
  }));
}

/** The V that each bend's numbers are for: the one that the plan took its value of, else the die's. */
function asPlanned({ flat, strokes, units, part_document: { material } }: SheetFlatRow, shop: ShopNow): Pick<BendContext, "openingOf" | "radiusOf"> {
  const dies = new Map(strokes.flatMap(({ bends, vOpening }) => (vOpening === null ? [] : bends.map((id) => [id, vOpening] as const))));
  const valued = new Map(flat.bends.flatMap(({ id, basis }) => (basis?.shop ? [[id, basis.shop.vOpening * mmPer(units)] as const] : [])));
  const facts = shop.lookup(material);
  return {
    openingOf: (id) => {
      const opening = valued.get(id) ?? dies.get(id);
      return opening === undefined ? null : mm(opening);
    },
    radiusOf: (id) => {
      const opening = dies.get(id);
      return opening === undefined || !facts ? null : { radius: naturalRadius(facts, mm(opening)), source: `natural radius of a V ${opening} mm die` };
    },
  };
}
