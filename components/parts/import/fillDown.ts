import type { BendDraft } from "../draft/partDraft";

/** What can be copied from one bend line to those below it. */
export type FillColumn = "direction" | "angle" | "insideRadius" | "kFactor";

/** The rows with one column's value of row `from` put into every row below it. A hem keeps its own angle and radius. */
export function fillDown(rows: readonly BendDraft[], column: FillColumn, from: number): readonly BendDraft[] {
  const source = rows[from];
  if (source === undefined) return rows;
  return rows.map((row, i) => (i <= from || (row.hem !== "none" && column !== "direction") ? row : { ...row, [column]: source[column] }));
}
