import { loadShopTable } from "./loadShopTable";
import { valueItem } from "./valueItem";
import { database } from "@/db/client";
import { numberColumn } from "@/lib/csv/numberColumn";
import { optionalColumn } from "@/lib/csv/optionalColumn";
import { textColumn } from "@/lib/csv/textColumn";
import { writeCsv } from "@/lib/csv/writeCsv";
import type { ValueState } from "@/lib/schemas/bendTableInputs";

const mm = { units: { mm: 1 } };
const columns = {
  material: textColumn("material", 60),
  thickness: numberColumn("nominal thickness", mm),
  vOpening: numberColumn("v opening", mm),
  punchRadius: numberColumn("punch radius", mm),
  angle: numberColumn("angle", { units: { "°": 1 } }),
  deduction: optionalColumn(numberColumn("deduction", mm)),
  expanded: optionalColumn(numberColumn("uncertainty of deduction", mm)),
  spread: optionalColumn(numberColumn("spread of deduction", mm)),
  k: optionalColumn(numberColumn("k")),
  radius: numberColumn("inside radius", mm),
  radiusSource: textColumn("inside radius from", 60),
  handbook: optionalColumn(numberColumn("handbook deduction", mm)),
  counted: numberColumn("trials that count"),
  excluded: numberColumn("trials excluded"),
  outliers: numberColumn("trials that lie apart"),
  lastMeasured: optionalColumn(textColumn("last measured", 10)),
  state: textColumn("state", 40),
};

const words: Readonly<Record<ValueState, string>> = { ok: "ok", outlier: "a trial lies apart", few: "fewer than three trials", none: "no trial counts" };

/** Every value as a CSV file. */
export async function exportValues(material: string | undefined, separator: "," | ";"): Promise<string> {
  const { table, materials } = await loadShopTable(database(), material);
  return writeCsv(columns, table.cells.map((cell) => {
    const item = valueItem(cell, materials);
    return {
      material: item.material, thickness: item.thicknessMm, vOpening: item.vOpeningMm, punchRadius: item.punchRadiusMm, angle: item.angleDeg,
      deduction: rounded(item.deductionMm), expanded: rounded(item.expandedMm), spread: rounded(item.spreadMm), k: rounded(item.k),
      radius: Number(item.radiusMm.toFixed(4)), radiusSource: item.radiusSource, handbook: rounded(item.handbookMm),
      counted: item.counted, excluded: item.excluded, outliers: item.outliers, lastMeasured: item.lastMeasured, state: words[item.state],
    };
  }), separator);
}

const rounded = (value: number | null): number | null => (value === null ? null : Number(value.toFixed(4)));
