import { nextLine } from "./nextLine";
import { lineFields, type LineField, type TrialLine } from "./trialDraft";

/**
 * Cells that were copied out of a spreadsheet (tabs between cells, one line each), laid over the lines from one cell on;
 * lines that are missing are added. Null when the text is not a block of cells.
 */
export function pastedLines(lines: readonly TrialLine[], text: string, at: { readonly line: number; readonly field: LineField }, newId: () => string): readonly TrialLine[] | null {
  const rows = text.replace(/\r\n?/g, "\n").replace(/\n$/, "").split("\n").map((row) => row.split("\t"));
  if (rows.length === 1 && rows[0]?.length === 1) return null;
  const from = lineFields.indexOf(at.field);
  const laid = [...lines];
  rows.forEach((cells, index) => {
    const old = laid[at.line + index] ?? nextLine(newId(), laid[at.line + index - 1]);
    const typed = cells.flatMap((cell, offset) => {
      const field = lineFields[from + offset];
      return field === undefined ? [] : [[field, cell.trim()] as const];
    });
    laid[at.line + index] = { ...old, ...Object.fromEntries(typed) };
  });
  return laid;
}
