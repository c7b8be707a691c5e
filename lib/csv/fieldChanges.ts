import type { CsvColumns, CsvRow } from "./csvColumn";
import { headingOf } from "./headingOf";

export interface FieldChange<Key> {
  readonly key: Key;
  /** The heading with its unit. */
  readonly field: string;
  readonly from: string;
  readonly to: string;
}

/** The fields that differ as they would be written to a file; values that only differ in digits beyond those are the same. */
export function fieldChanges<Columns extends CsvColumns>(
  columns: Columns, given: Partial<CsvRow<Columns>>, before: CsvRow<Columns> | undefined,
): readonly FieldChange<keyof Columns & string>[] {
  return Object.keys(columns).flatMap((key) => {
    const column = columns[key];
    const value = given[key];
    if (column === undefined || value === undefined) return [];
    const [from, to] = [before === undefined ? "" : String(column.write(before[key])), String(column.write(value))];
    return before === undefined ? (to === "" ? [] : [{ key, field: headingOf(column), from, to }]) : from === to ? [] : [{ key, field: headingOf(column), from, to }];
  });
}
