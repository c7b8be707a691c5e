import { mm, type Mm, type Rad } from "../core/units";
import { kFactorFromDeduction } from "../handbook/kFactorFromDeduction";
import { outsideSetback } from "../handbook/outsideSetback";
import type { TrialInMm } from "./trialInMm";
import type { BudgetLine } from "./trialResult";

export interface TrialK {
  readonly deduction: Mm;
  readonly allowance: Mm;
  readonly k: number;
  readonly budget: readonly BudgetLine[];
}

/**
 * Deduction, allowance and K of a trial for a given inside radius, with the partial derivatives of JCGM 100:2008, 5.1.3. With f the
 * setback for each unit of r + t (tan(angle / 2), above 90 degrees 1) and f' its derivative:
 *   BD = a + b - L                    dBD/da = dBD/db = 1, dBD/dL = -1
 *   BA = 2 f (r + t) - BD             dBA/dangle = 2 f' (r + t), dBA/dt = 2 f, dBA/dr = 2 f
 *   K = (BA / angle - r) / t          dK/dBD = -1 / (angle t), dK/dangle = (dBA/dangle - BA / angle) / (angle t),
 *                                     dK/dt = (2 f / angle - K) / t, dK/dr = (2 f / angle - 1) / t
 * The readings count as independent. For one calliper that is on the safe side: its error goes into a + b - L once, not three times.
 */
export function trialK({ thickness: t, angle, blank, flanges: [a, b], standard }: TrialInMm, radius: Mm, radiusStandard: Mm): TrialK {
  const deduction = mm(a + b - blank);
  const allowance = mm(2 * outsideSetback(angle, radius, t) - deduction);
  const k = kFactorFromDeduction(deduction, angle, radius, t);
  const [f, slope] = setbackSlope(angle);
  const perDeduction = -1 / (angle * t);
  const turn = 2 * slope * (radius + t);
  const line = (of: BudgetLine["of"], u: number, onDeduction: number, onAllowance: number, onK: number): BudgetLine => ({ of, standard: u, onDeduction, onAllowance, onK });
  return {
    deduction,
    allowance,
    k,
    budget: [
      line("flanges[0]", standard.length, 1, -1, perDeduction),
      line("flanges[1]", standard.length, 1, -1, perDeduction),
      line("blankLength", standard.length, -1, 1, -perDeduction),
      line("thickness", standard.thickness, 0, 2 * f, ((2 * f) / angle - k) / t),
      line("angle", standard.angle, 0, turn, (turn - allowance / angle) / (angle * t)),
      line("insideRadius", radiusStandard, 0, 2 * f, ((2 * f) / angle - 1) / t),
    ],
  };
}

/** f and f'. At 90 degrees, where the two ways of measuring meet, the steeper side counts. */
function setbackSlope(angle: Rad): readonly [number, number] {
  if (angle > Math.PI / 2) return [1, 0];
  const tangent = Math.tan(angle / 2);
  return [tangent, (1 + tangent * tangent) / 2];
}
