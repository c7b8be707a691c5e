import { kgPerCubicMetre, mpa } from "@/bending/core/units";
import { materialFields, type MaterialAllowance, type MaterialFacts, type MaterialField, type Origin } from "@/bending/handbook/material";
import type { MaterialCsvRow } from "./materialCsvColumns";

/** A row of a table as a material. Origins that a row leaves empty are `unsaid`. */
export function materialOfCsv(row: MaterialCsvRow, unsaid: Origin): MaterialFacts {
  const allowance: MaterialAllowance = row.rule === "k" ? { rule: "k", k: row.k ?? NaN } : { rule: row.rule };
  return {
    id: row.id, name: row.name, designation: row.designation ?? row.id, standard: row.standard, group: row.group,
    tensile: [mpa(row.tensileLow), mpa(row.tensileHigh)], yield: mpa(row.yield), modulus: mpa(row.modulus * 1000), density: kgPerCubicMetre(row.density),
    straightLengthGroup: row.straightLengthGroup, naturalRadiusRatio: row.naturalRadiusRatio, defaultRadiusPerThickness: row.defaultRadiusPerThickness,
    allowance, minimumRadii: row.minimumRadii, springbackRow: row.springbackRow,
    origins: Object.fromEntries(materialFields.map((field) => [field, row[`${field}Origin`] ?? unsaid])) as Record<MaterialField, Origin>,
  };
}
