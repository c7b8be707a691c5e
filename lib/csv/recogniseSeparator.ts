import type { CsvColumns } from "./csvColumn";
import { matchHeadings } from "./matchHeadings";
import { parseCells } from "./parseCells";

const SEPARATORS = [",", ";", "\t"] as const;
const said = /^\uFEFF?sep=([,;\t])\r?\n/;

/**
 * The separator under which most headings are known, and among those the one that parts the first line into most. A first
 * line `sep=;`, which some spreadsheets write, says it outright; it is left empty so that the line numbers stay right.
 */
export function recogniseSeparator(text: string, columns: CsvColumns): { readonly body: string; readonly separator: (typeof SEPARATORS)[number] } {
  const saidOne = said.exec(text)?.[1];
  const told = SEPARATORS.find((separator) => separator === saidOne);
  if (told !== undefined) return { body: text.replace(said, "\n"), separator: told };
  const scored = SEPARATORS.map((separator) => {
    const parsed = parseCells(headOf(text), separator, 1);
    const cells = parsed.ok ? (parsed.value[0]?.cells ?? []) : [];
    return { separator, known: matchHeadings(columns, cells).headings.filter(({ key }) => key !== undefined).length, cells: cells.length };
  });
  const best = scored.reduce((a, b) => (b.known > a.known || (b.known === a.known && b.cells > a.cells) ? b : a));
  return { body: text, separator: best.separator };
}

/** The first line that is not empty. */
const headOf = (text: string): string => /^\s*[^\r\n]*/.exec(text.replace(/^\uFEFF/, ""))?.[0].trim() ?? "";
