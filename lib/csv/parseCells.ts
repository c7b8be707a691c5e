import { CsvError, parse } from "csv-parse/sync";
import type { CsvFault } from "./csvTable";
import { fail, ok, type Result } from "@/bending/core/result";

export interface Cells {
  readonly line: number;
  readonly cells: readonly string[];
}

interface Parsed {
  readonly record: string[];
  readonly info: { readonly lines: number };
}

/** The cells of each line that has any, trimmed, with the number of the line where it begins. `most`: lines that are read. */
export function parseCells(text: string, separator: string, most?: number): Result<readonly Cells[], CsvFault> {
  try {
    const options = { delimiter: separator, bom: true, trim: true, relax_column_count: true, record_delimiter: "\n", info: true } as const;
    const records = parse(text.replace(/\r\n?/g, "\n"), most === undefined ? options : { ...options, to: most }) as unknown as readonly Parsed[];
    return ok(records.flatMap(({ record }, index) => (record.every((cell) => cell === "") ? [] : [{ line: (records[index - 1]?.info.lines ?? 0) + 1, cells: record }])));
  } catch (thrown) {
    if (!(thrown instanceof CsvError)) throw thrown;
    const line = typeof thrown.lines === "number" ? thrown.lines : undefined;
    return fail({ message: faultWords(thrown.code), ...(line === undefined ? {} : { line }) });
  }
}

function faultWords(code: string): string {
  switch (code) {
    case "CSV_QUOTE_NOT_CLOSED": return 'A quotation mark (") is opened here and never closed.';
    case "CSV_INVALID_CLOSING_QUOTE":
    case "INVALID_OPENING_QUOTE": return 'A quotation mark (") stands in the middle of a value. Put the whole value in quotation marks and write each one inside it twice.';
    default: return "This is not a table of separated values.";
  }
}
