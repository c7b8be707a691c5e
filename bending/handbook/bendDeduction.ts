import { mm, type Mm, type Rad } from "../core/units";
import { outsideSetback } from "./outsideSetback";

/**
 * What the sum of two outside legs is longer than the flat: 2 x outside setback - allowance. Above 90 degrees
 * the legs run to the outermost tangent (DIN 6935), not to the far-off apex.
 */
export function bendDeduction(angle: Rad, insideRadius: Mm, thickness: Mm, allowance: Mm): Mm {
  return mm(2 * outsideSetback(angle, insideRadius, thickness) - allowance);
}
