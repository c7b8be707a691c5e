import { mm, type Mm } from "../core/units";

/** Times the thickness, up to that thickness (trade chart; between its rows the next one holds). */
const ROWS: readonly (readonly [upTo: number, times: number])[] = [[2.6, 6], [8, 8], [12, 10], [Infinity, 12]];

/** The usual V opening for a thickness: 6 t up to 2.6 mm, 8 t up to 8 mm, 10 t up to 12 mm, then 12 t (trade chart). */
export function vOpeningRule(thickness: Mm): Mm {
  const row = ROWS.find(([upTo]) => thickness <= upTo);
  return mm((row?.[1] ?? 12) * thickness);
}
