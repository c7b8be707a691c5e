import { mm, type Mm, type Rad } from "../core/units";
import { kFromAllowance } from "./kFromAllowance";
import { outsideSetback } from "./outsideSetback";

/**
 * K out of a measured deduction: BA = 2 x outside setback - BD, K = (BA / angle - r) / t. A measured deduction
 * may give a K that no neutral line can have (over 1, under 0): it is returned as it is.
 */
export function kFactorFromDeduction(deduction: Mm, angle: Rad, insideRadius: Mm, thickness: Mm): number {
  const allowance = mm(2 * outsideSetback(angle, insideRadius, thickness) - deduction);
  return kFromAllowance(allowance, angle, insideRadius, thickness);
}
