import { mm, type MPa } from "../core/units";
import type { MinimumRadiusTable } from "./material";

/** Thickness up to; radius for tensile strength up to 390, 490 and 640 MPa, mm. */
const ROWS: readonly (readonly [upTo: number, radii: readonly [number, number, number]])[] = [
  [1, [1, 1.2, 1.6]], [1.5, [1.6, 2, 2.5]], [2.5, [2.5, 3, 4]], [3, [3, 4, 5]], [4, [5, 5, 6]], [5, [6, 8, 8]],
  [6, [8, 10, 10]], [7, [10, 12, 12]], [8, [12, 16, 16]], [10, [16, 20, 20]], [12, [20, 25, 25]], [14, [25, 28, 32]],
  [16, [28, 32, 36]], [18, [36, 40, 45]], [20, [40, 45, 50]],
];

/**
 * Smallest inside radii of steel by DIN 6935 (1975-10) for its lowest tensile strength, up to 120 degrees. Along the rolling
 * direction it takes the next thicker row, so the last row says nothing of that. Null over 640 MPa.
 */
export function steelRadiusTable(tensile: MPa): MinimumRadiusTable | null {
  const column = tensile <= 390 ? 0 : tensile <= 490 ? 1 : tensile <= 640 ? 2 : null;
  if (column === null) return null;
  return { as: "mm", rows: ROWS.map(([upTo, radii], row) => ({ upTo: mm(upTo), across: radii[column], along: ROWS[row + 1]?.[1][column] ?? null })) };
}
