import { materialFields, type MaterialFacts, type Origin } from "@/bending/handbook/material";
import type { MaterialCsvRow, OriginKey } from "./materialCsvColumns";

/** A material as a row of a table: modulus in GPa, everything in the units of the columns. */
export function materialToCsv(facts: MaterialFacts): MaterialCsvRow {
  const { tensile: [tensileLow, tensileHigh], allowance, origins, modulus, ...same } = facts;
  const origin = Object.fromEntries(materialFields.map((field) => [`${field}Origin`, origins[field]])) as Record<OriginKey, Origin>;
  return {
    id: same.id, name: same.name, designation: same.designation, standard: same.standard, group: same.group, yield: same.yield, density: same.density,
    straightLengthGroup: same.straightLengthGroup, naturalRadiusRatio: same.naturalRadiusRatio, defaultRadiusPerThickness: same.defaultRadiusPerThickness,
    minimumRadii: same.minimumRadii, springbackRow: same.springbackRow,
    tensileLow, tensileHigh, modulus: modulus / 1000, rule: allowance.rule, k: allowance.rule === "k" ? allowance.k : null, ...origin,
  };
}
