import { stringify } from "csv-stringify/sync";
import type { CsvColumns, CsvRow } from "./csvColumn";
import { headingOf } from "./headingOf";

/**
 * A CSV file (RFC 4180, with the mark of UTF-8 in front so that spreadsheets read it right). With `;` numbers have a
 * decimal comma. Text that a spreadsheet would take for a formula gets an apostrophe in front.
 */
export function writeCsv<Columns extends CsvColumns>(columns: Columns, rows: readonly CsvRow<Columns>[], separator: "," | ";" = ","): string {
  const keys = Object.keys(columns);
  const lines = rows.map((row) => keys.map((key) => columns[key]?.write(row[key]) ?? ""));
  return stringify([keys.map((key) => headingOf(columns[key]!)), ...lines], {
    bom: true,
    delimiter: separator,
    record_delimiter: "windows",
    escape_formulas: true,
    cast: { number: (value) => (separator === ";" ? String(value).replace(".", ",") : String(value)) },
  });
}
