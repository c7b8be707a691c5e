import { MM_PER_INCH, type Mm } from "../core/units";

const RADII = [0.03, 0.06, 0.09, 0.12, 0.188];

/** K by thickness in inches; columns for the inside radii .030, .060, .090, .120 and .188 in. */
export const empiricalKTable = {
  aluminium: [
    [0.032, [0.398, 0.394, 0.391, 0.391, 0.392]], [0.063, [0.404, 0.402, 0.401, 0.401, 0.401]],
    [0.1, [0.406, 0.381, 0.38, 0.38, 0.38]], [0.125, [0.407, 0.407, 0.406, 0.406, 0.406]],
  ],
  "cold-rolled steel": [
    [0.048, [0.438, 0.433, 0.433, 0.433, 0.42]], [0.06, [0.467, 0.463, 0.463, 0.463, 0.453]], [0.093, [0.459, 0.457, 0.456, 0.456, 0.45]],
  ],
  stainless: [[0.029, [0.483, 0.479, 0.475, 0.475, 0.454]], [0.078, [0.449, 0.446, 0.446, 0.446, 0.438]]],
} as const satisfies Record<string, readonly (readonly [number, readonly number[]])[]>;

/** Two sizes are one entry of the table within half a thousandth of an inch, mm. */
const SAME_ENTRY = 0.0127;

/**
 * Measured K as a secondary page gives it after Machinery's Handbook, 26th edition: printed entries alone, null between
 * them, since the table follows no single rule (aluminium .100 in with radii over .030 in looks like a slip).
 */
export function empiricalK(material: keyof typeof empiricalKTable, insideRadius: Mm, thickness: Mm): number | null {
  const rows: readonly (readonly [number, readonly number[]])[] = empiricalKTable[material];
  const same = (inches: number, value: Mm) => Math.abs(inches * MM_PER_INCH - value) <= SAME_ENTRY;
  const row = rows.find(([inches]) => same(inches, thickness));
  return row?.[1][RADII.findIndex((inches) => same(inches, insideRadius))] ?? null;
}
