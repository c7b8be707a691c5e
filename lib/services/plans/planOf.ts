import type { PlanQuestion } from "./planInputs";
import { planInputs } from "./planInputs";
import { inputsDigest } from "./inputsDigest";
import { storePlan } from "./storePlan";
import { startJob } from "./startJob";
import { ok, type Result } from "@/bending/core/result";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import { invariant } from "@/bending/core/invariant";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { database } from "@/db/client";
import { findSamePlan } from "@/db/plans/findSamePlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import { planJobs } from "@/lib/jobs/planJobs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Plans in the background; what was planned before from the same inputs is answered at once. */
export async function planOf(person: SignedInPerson, question: PlanQuestion, fromPlanId: string | null): Promise<Result<PlanJobView, Failure>> {
  const db = database();
  const inputs = await planInputs(db, question);
  if (!inputs.ok) return inputs;
  const { task, partId, revisionId, subject } = inputs.value;
  const digest = inputsDigest(PLAN_ENGINE, task);
  const place = { partId, fromPlanId, subject, by: person.name };
  const same = await findSamePlan(db, revisionId, digest, task.limitMs);
  if (same !== undefined) return ok(planJobs().finished(same, place));
  return startJob({
    key: `plan ${revisionId} ${digest} ${task.limitMs}`,
    place,
    task: { kind: "plan", limitMs: task.limitMs, task },
    store: async (answer) => {
      invariant(answer.kind === "plan", "a planning task answers a plan");
      const { plan, ended } = answer;
      return { planId: await storePlan(person, inputs.value, { plan, ended, digest, fromPlanId }), message: endMessage(plan), result: null };
    },
  });
}

function endMessage(plan: PlanDocument): string {
  switch (plan.status) {
    case "optimal": return "Done: least total time, proven";
    case "feasible": return "Done: it works; the search ended before it was proven best";
    case "infeasible": return "Done: it cannot be made as it stands; the plan says why";
    case "unknown": return "Done: undecided in the time allowed";
    default: return plan.status satisfies never;
  }
}
