import type { CsvColumn } from "./csvColumn";

/** A column's heading as it is written, with its unit: "thickness (mm)". */
export function headingOf(column: Pick<CsvColumn<unknown>, "header" | "units">): string {
  const unit = Object.keys(column.units)[0];
  return unit === undefined ? column.header : `${column.header} (${unit})`;
}
