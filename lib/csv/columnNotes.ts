import type { CsvColumns } from "./csvColumn";
import { headingOf } from "./headingOf";

export interface ColumnNote {
  readonly heading: string;
  readonly expects: string;
  readonly required: boolean;
}

/** The columns as a person who fills a table must know them. */
export function columnNotes(columns: CsvColumns): readonly ColumnNote[] {
  return Object.values(columns).map((column) => {
    const others = Object.keys(column.units).slice(1);
    const units = others.length === 0 ? "" : `; ${others.map((unit) => `(${unit})`).join(" or ")} in the heading is read too`;
    return { heading: headingOf(column), expects: `${column.expects}${units}`, required: column.required };
  });
}
