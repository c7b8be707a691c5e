import { fail, ok } from "@/bending/core/result";
import { materialFields, materialGroups, materialRules, originKinds, straightLengthGroups, type MaterialField, type MinimumRadiusTable, type Origin } from "@/bending/handbook/material";
import { choiceColumn } from "@/lib/csv/choiceColumn";
import type { CsvColumn, CsvRow } from "@/lib/csv/csvColumn";
import { numberColumn } from "@/lib/csv/numberColumn";
import { optionalColumn } from "@/lib/csv/optionalColumn";
import { textColumn } from "@/lib/csv/textColumn";
import { springbackRows } from "./materialInputs";
import { formatMinimumRadii } from "./formatMinimumRadii";
import { minimumRadiiExpects, parseMinimumRadii } from "./parseMinimumRadii";

const radiiColumn: CsvColumn<MinimumRadiusTable> = {
  header: "smallest inside radii", also: ["minimum radii"], units: {}, required: true, numeric: false, expects: minimumRadiiExpects, example: "up to 1: 1 / 1.2",
  read: (cell) => parseMinimumRadii(cell),
  write: formatMinimumRadii,
};

const originColumn = (header: string): CsvColumn<Origin> => ({
  header, also: [], units: {}, required: true, numeric: false, expects: `${originKinds.join(", ")} and where, as "published: EN 10025-2"`, example: "published: EN 10025-2",
  read(cell) {
    const [, kind, text] = /^(\w+)\s*:\s*(.+)$/s.exec(cell) ?? [];
    const found = originKinds.find((one) => one === kind?.toLowerCase());
    return found === undefined || text === undefined || text.length > 300 ? fail(`must be ${originKinds.join(", ")} and where, as "published: EN 10025-2"`) : ok({ kind: found, text });
  },
  write: ({ kind, text }) => `${kind}: ${text}`,
});

/** What the columns that say where a value is from are headed with. */
const originHeaders: Readonly<Record<MaterialField, string>> = {
  tensile: "tensile source", yield: "yield source", modulus: "modulus source", density: "density source", straightLengthGroup: "straight length source",
  naturalRadiusRatio: "natural radius source", defaultRadiusPerThickness: "usual radius source", allowance: "K source", minimumRadii: "smallest radii source", springbackRow: "springback source",
};

export type OriginKey = `${MaterialField}Origin`;
const originColumns = Object.fromEntries(materialFields.map((field) => [`${field}Origin`, optionalColumn(originColumn(originHeaders[field]))])) as Record<OriginKey, CsvColumn<Origin | null>>;

/** The values of a material as columns: for files, for histories and for comparing two versions. */
export const materialValueColumns = {
  id: textColumn("short name", 60, { also: ["id", "material"], example: "S235" }),
  name: textColumn("name", 120, { example: "Structural steel S235" }),
  designation: optionalColumn(textColumn("designation", 120, { example: "S235JR" })),
  standard: textColumn("standard", 120, { example: "EN 10025-2" }),
  group: choiceColumn("group", materialGroups),
  tensileLow: numberColumn("tensile lowest", { units: { MPa: 1 }, over: 0 }),
  tensileHigh: numberColumn("tensile highest", { units: { MPa: 1 }, over: 0 }),
  yield: numberColumn("yield", { units: { MPa: 1 }, over: 0 }),
  modulus: numberColumn("modulus", { units: { GPa: 1, MPa: 0.001 }, over: 0 }),
  density: numberColumn("density", { units: { "kg/m³": 1, "g/cm³": 1000 }, over: 0 }),
  straightLengthGroup: choiceColumn("straight length", straightLengthGroups),
  naturalRadiusRatio: numberColumn("natural radius per V", { over: 0 }),
  defaultRadiusPerThickness: numberColumn("usual radius per thickness", { from: 0 }),
  rule: choiceColumn("K by", materialRules),
  k: optionalColumn(numberColumn("K", { over: 0, upTo: 1 })),
  minimumRadii: optionalColumn(radiiColumn),
  springbackRow: optionalColumn(choiceColumn("springback row", springbackRows)),
};

export const materialCsvColumns = { ...materialValueColumns, ...originColumns };

export type MaterialCsvRow = CsvRow<typeof materialCsvColumns>;
