import type { MaterialFacts } from "@/bending/handbook/material";
import { fieldChanges } from "@/lib/csv/fieldChanges";
import { materialCsvColumns, materialValueColumns } from "./materialCsvColumns";
import { materialToCsv } from "./materialToCsv";
import type { ValueChange } from "./materialViews";

/** Names and standards tell a material; no formula reads them. */
const { id, name, designation, standard, ...calculated } = materialValueColumns;
const told = { id, name, designation, standard };

/**
 * What differs between two versions of a material, in the units that its table has. `everything`: names and origins too;
 * else only the values that calculations use.
 */
export function materialChanges(before: MaterialFacts, after: MaterialFacts, everything = true): readonly ValueChange[] {
  const columns = everything ? { ...told, ...materialCsvColumns } : calculated;
  return fieldChanges(columns, materialToCsv(after), materialToCsv(before)).map(({ field, from, to }) => ({ field, from, to }));
}
