import type { ColumnWords, CsvColumn } from "./csvColumn";
import { fail, ok } from "@/bending/core/result";

/** Signs that a spreadsheet takes for the start of a formula, the full-width ones too. */
const guarded = /^'+[=+\-@\t\r\uFF1D\uFF0B\uFF0D\uFF20]/;
const unstorable = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]|\p{Cs}/u;

/**
 * Text of at most `most` characters. An apostrophe before a sign of a formula is the guard that `writeCsv` puts there; it
 * is taken off again, so that a file which is read back changes nothing.
 */
export function textColumn(header: string, most: number, words: ColumnWords = {}): CsvColumn<string> {
  return {
    header, also: words.also ?? [], units: {}, required: true, numeric: false,
    expects: words.expects ?? `text of at most ${most} characters`, example: words.example ?? "",
    read(cell) {
      const text = guarded.test(cell) ? cell.slice(1) : cell;
      if (text.length > most) return fail(`must be at most ${most} characters`);
      return unstorable.test(text) ? fail("must not contain control characters") : ok(text);
    },
    write: (text) => (guarded.test(text) ? `'${text}` : text),
  };
}
