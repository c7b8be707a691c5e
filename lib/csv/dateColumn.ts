import type { ColumnWords, CsvColumn } from "./csvColumn";
import { fail, ok } from "@/bending/core/result";

const written = /^\d{4}-\d{2}-\d{2}$/;

/** A day as `2026-12-01` (ISO 8601). Other ways of writing it may mean two days, so they are refused. */
export function dateColumn(header: string, words: ColumnWords = {}): CsvColumn<string> {
  const expects = words.expects ?? "a day as 2026-12-01";
  return {
    header, expects, also: words.also ?? [], units: {}, required: true, numeric: false, example: words.example ?? "2026-12-01",
    read(cell) {
      const day = written.test(cell) ? new Date(`${cell}T00:00:00Z`) : undefined;
      const real = day !== undefined && !Number.isNaN(day.getTime()) && day.toISOString().startsWith(cell);
      return real ? ok(cell) : fail(`must be ${expects}`);
    },
    write: (day) => day,
  };
}
