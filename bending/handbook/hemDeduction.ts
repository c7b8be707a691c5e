import { mm, rad, type Mm } from "../core/units";
import { bendAllowance } from "./bendAllowance";
import { bendDeduction } from "./bendDeduction";

/**
 * Deduction of a hem with `gap` between its legs, lengths to the outermost tangent: 2 (r + t) - pi (r + k t), r = gap / 2.
 * With no gap and K = 0.5 that is 0.429 t, which agrees with shop practice of about 0.43 t (from memory).
 */
export function hemDeduction(thickness: Mm, gap: Mm = mm(0), k = 0.5): Mm {
  const [turned, radius] = [rad(Math.PI), mm(gap / 2)];
  return bendDeduction(turned, radius, thickness, bendAllowance(turned, radius, k, thickness));
}
