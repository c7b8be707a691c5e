import type { CsvColumn } from "./csvColumn";
import { ok } from "@/bending/core/result";

/** The same column, but it may be missing (then nothing of it changes), and an empty cell means that there is no value. */
export function optionalColumn<Value>(column: CsvColumn<Value>): CsvColumn<Value | null> {
  return {
    ...column,
    required: false,
    expects: `${column.expects}, or empty`,
    read: (cell, how) => (cell === "" ? ok(null) : column.read(cell, how)),
    write: (value) => (value === null ? "" : column.write(value)),
  };
}
