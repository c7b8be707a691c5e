import type { Mm, Rad } from "../core/units";
import { bendAllowance } from "../handbook/bendAllowance";
import { bendDeduction } from "../handbook/bendDeduction";

/** The deduction that a K for an inside radius means at a thickness and angle. */
export function deductionFor(k: number, radius: Mm, { thickness, angle }: { readonly thickness: Mm; readonly angle: Rad }): Mm {
  return bendDeduction(angle, radius, thickness, bendAllowance(angle, radius, k, thickness));
}
