import { mm, type Mm } from "../core/units";

/** Over, up to (mm) and radius over thickness. */
const ROWS: readonly (readonly [over: number, upTo: number, times: number])[] = [[0.2, 0.5, 0.5], [0.5, 1.5, 1], [1.5, 6, 1.5], [6, 12.5, 2.5]];

/** Smallest inside radius of EN AW-5052 in H22 and H32 at 90 degrees (EN 485-2, second-hand). Null outside 0.2 to 12.5 mm. */
export function en485MinimumRadius(thickness: Mm): Mm | null {
  const row = ROWS.find(([, upTo]) => thickness <= upTo);
  return row === undefined || thickness < 0.2 ? null : mm(row[2] * thickness);
}
