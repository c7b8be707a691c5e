import { materialFields, type MaterialField, type Origin } from "@/bending/handbook/material";
import { materialProblems } from "@/bending/handbook/materialProblems";
import type { CsvImportRules } from "@/lib/csv/dryRunCsv";
import { materialCsvColumns, type MaterialCsvRow } from "@/lib/schemas/materialCsvColumns";
import { materialFactsSchema } from "@/lib/schemas/materialInputs";
import { materialOfCsv } from "@/lib/schemas/materialOfCsv";

type Key = keyof MaterialCsvRow;

/** The columns that hold each value. */
const columnsOf: Readonly<Record<MaterialField, readonly Key[]>> = {
  tensile: ["tensileLow", "tensileHigh"], yield: ["yield"], modulus: ["modulus"], density: ["density"], straightLengthGroup: ["straightLengthGroup"],
  naturalRadiusRatio: ["naturalRadiusRatio"], defaultRadiusPerThickness: ["defaultRadiusPerThickness"], allowance: ["rule", "k"], minimumRadii: ["minimumRadii"], springbackRow: ["springbackRow"],
};

/**
 * How a table of materials is judged. A value that changes, and whose source the table does not say, is from then on the
 * shop's own, from this table: it is never left under the name of the standard that the old value was from.
 */
export function materialImportRules(fileName: string): CsvImportRules<typeof materialCsvColumns> & { readonly unsaid: Origin } {
  const unsaid: Origin = { kind: "shop", text: fileName === "" ? "imported from a table" : `imported from ${fileName}` };
  return {
    unsaid,
    columns: materialCsvColumns,
    blank: { designation: null, k: null, minimumRadii: null, springbackRow: null },
    keyOf: ({ id }) => id,
    labelOf: ({ id }) => id ?? "",
    adjust: (given, before) => {
      const changed = (field: MaterialField) => before === undefined || columnsOf[field].some((key) => given[key] !== undefined && written(key, given) !== written(key, before));
      const shop = materialFields.filter((field) => changed(field) && (given[`${field}Origin`] ?? null) === null);
      const kept = materialFields.filter((field) => !shop.includes(field) && given[`${field}Origin`] === null);
      return {
        ...given,
        ...(given.designation === null && given.id !== undefined ? { designation: given.id } : {}),
        ...(given.rule !== undefined && given.rule !== "k" ? { k: null } : {}),
        ...Object.fromEntries(shop.map((field) => [`${field}Origin`, unsaid])),
        ...Object.fromEntries(kept.map((field) => [`${field}Origin`, before?.[`${field}Origin`]])),
      };
    },
    check: (row) => {
      const facts = materialOfCsv(row, unsaid);
      const shape = materialFactsSchema.safeParse(facts);
      const values = materialProblems(facts).map(({ path, message }) => ({ field: columnOf(path), message }));
      const texts = (shape.error?.issues ?? []).map(({ path, message }) => ({ field: columnOf(path.join(".")), message }));
      return [...values, ...texts.filter(({ field }) => !values.some((named) => named.field === field))];
    },
  };
}

const written = (key: Key, row: Partial<MaterialCsvRow>): unknown => {
  const value = row[key];
  return value === undefined || value === null ? "" : materialCsvColumns[key].write(value as never);
};

function columnOf(path: string): Key {
  if (path.startsWith("tensile")) return path.includes("1") ? "tensileHigh" : "tensileLow";
  if (path.startsWith("allowance")) return "k";
  const origin = /^origins\.(\w+)/.exec(path)?.[1];
  const first = origin === undefined ? /^\w+/.exec(path)?.[0] : `${origin}Origin`;
  return Object.keys(materialCsvColumns).find((key): key is Key => key === first) ?? "id";
}
