import { mm, type Mm, type Rad } from "../core/units";
import { apexSetback } from "./apexSetback";

/** Bend deduction for legs that run to the outside apex at any angle: 2 x apex setback - allowance. Under 180 degrees. */
export function apexDeduction(angle: Rad, insideRadius: Mm, thickness: Mm, allowance: Mm): Mm {
  return mm(2 * apexSetback(angle, insideRadius, thickness) - allowance);
}
