import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { BendTrial, TrialExclusion } from "./bendTrial";

/** Takes a trial out of the values: a person's act, with a reason. The trial stays in the table and in sight. */
export function excludeTrial(trial: BendTrial, exclusion: TrialExclusion): Result<BendTrial, FieldProblem> {
  if (exclusion.reason.trim() === "") return fail({ path: "reason", message: "say why the trial does not count, such as: the strip slipped off the gauge" });
  return ok({ ...trial, excluded: exclusion });
}
