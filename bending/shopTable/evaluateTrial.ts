import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import { mm, toDeg } from "../core/units";
import type { MaterialFacts } from "../handbook/material";
import { angleClass } from "./angleClass";
import type { BendTrial } from "./bendTrial";
import { trialInMm } from "./trialInMm";
import { trialK } from "./trialK";
import { trialProblems } from "./trialProblems";
import type { TrialResult } from "./trialResult";
import { uncertain } from "./uncertain";

/**
 * Deduction, allowance and K of a trial in mm, with the uncertainty that its instruments imply; or what cannot be true of it. K is
 * for the measured inside radius, else for the larger of the V's natural radius and the punch radius (an air bend is as round as
 * the V makes it, unless the punch is rounder: common practice). That expected radius enters without an uncertainty of its own: K
 * and radius together give the measured deduction back whatever it is.
 */
export function evaluateTrial(trial: BendTrial, material: MaterialFacts): Result<TrialResult, readonly FieldProblem[]> {
  const problems = trialProblems(trial, material);
  if (problems.length > 0) return fail(problems);
  const measured = trialInMm(trial, material);
  const { measuredRadius, expectedRadius, followsDie } = measured;
  const radius = measuredRadius ?? expectedRadius;
  const { deduction, allowance, k, budget } = trialK(measured, radius, measuredRadius === null ? mm(0) : measured.standard.radius);
  return ok({
    deduction: uncertain(deduction, budget, "onDeduction"),
    allowance: uncertain(allowance, budget, "onAllowance"),
    k: uncertain(k, budget, "onK"),
    insideRadius: { value: radius, source: measuredRadius !== null ? "measured" : followsDie ? "natural radius of the V" : "punch radius" },
    thicknessClass: measured.thicknessClass,
    angleClass: angleClass(toDeg(measured.angle)),
    budget,
  });
}
