import { mm, type Mm, type Rad } from "../core/units";
import type { MaterialFacts, MinimumRadius } from "./material";

/** Thickness up to; radius for tensile strength up to 390, 490 and 640 MPa. DIN 6935 (1975-10), across the rolling direction. */
const STEEL: readonly (readonly [number, readonly [number, number, number]])[] = [
  [1, [1, 1.2, 1.6]], [1.5, [1.6, 2, 2.5]], [2.5, [2.5, 3, 4]], [3, [3, 4, 5]], [4, [5, 5, 6]], [5, [6, 8, 8]],
  [6, [8, 10, 10]], [7, [10, 12, 12]], [8, [12, 16, 16]], [10, [16, 20, 20]], [12, [20, 25, 25]], [14, [25, 28, 32]],
  [16, [28, 32, 36]], [18, [36, 40, 45]], [20, [40, 45, 50]],
];
const RIGHT_ANGLE_AND_A_THIRD = (120 * Math.PI) / 180 + 1e-9;

/**
 * Smallest inside radius of steel by DIN 6935 (1975-10) across the rolling direction; along it, and beyond
 * 120 degrees, the next thicker row. Null where the table has no row: other materials, or thicker than 20 mm.
 */
export function minimumRadius(material: MaterialFacts, thickness: Mm, angle: Rad, alongGrain = false): MinimumRadius | null {
  if (material.group !== "steel") return null;
  const row = STEEL.findIndex(([upTo]) => thickness <= upTo);
  const found = row < 0 ? undefined : STEEL[alongGrain || angle > RIGHT_ANGLE_AND_A_THIRD ? row + 1 : row];
  const column = material.tensile[0] <= 390 ? 0 : material.tensile[0] <= 490 ? 1 : material.tensile[0] <= 640 ? 2 : null;
  const radius = column === null ? undefined : found?.[1][column];
  return radius === undefined ? null : { radius: mm(radius), source: `DIN 6935 (1975-10), ${alongGrain ? "along" : "across"} the rolling direction` };
}
