import { inputsDigest } from "./inputsDigest";
import { noSuchPlan } from "./noSuchPlan";
import { planInputs } from "./planInputs";
import { questionOf } from "./questionOf";
import { startJob } from "./startJob";
import { invariant } from "@/bending/core/invariant";
import { fail, type Result } from "@/bending/core/result";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import { database } from "@/db/client";
import { addToPlan } from "@/db/plans/addToPlan";
import { findPlan } from "@/db/plans/findPlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import type { PlanJobView } from "@/lib/schemas/views";

const LIMIT_MS = 180_000;

/** Looks how far each time setting may be off before another plan wins; of a plan of the planner's own, and the shop as it was planned with. */
export async function findRobustness(person: SignedInPerson, planId: string): Promise<Result<PlanJobView, Failure>> {
  const db = database();
  const row = await findPlan(db, planId);
  if (!row) return noSuchPlan();
  if (row.status !== "optimal" || row.origin === "chosen") return fail({ kind: "conflict", message: "Only a plan that is proven to be the best can be asked how firm that is." });
  const inputs = await planInputs(db, questionOf(row));
  if (!inputs.ok) return inputs;
  const { task, partId, subject } = inputs.value;
  if (inputsDigest(PLAN_ENGINE, task) !== row.inputs_digest) return fail({ kind: "conflict", message: "The shop or the planner has changed since this plan was made: another plan may be the best by now. Plan the part again first." });
  return startJob({
    key: `firm ${planId}`,
    place: { partId, fromPlanId: planId, subject, by: person.name },
    task: { kind: "firm", limitMs: LIMIT_MS, task, plan: row.plan },
    store: async (answer) => {
      invariant(answer.kind === "firm", "a task that asks how firm answers how firm");
      await addToPlan(database(), planId, { robustness: answer.robustness });
      return { planId: null, message: "Done: see how far the times may be off", result: { kind: "firm", robustness: answer.robustness } };
    },
  });
}
