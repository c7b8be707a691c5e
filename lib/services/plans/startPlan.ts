import type { z } from "zod";
import { inputsDigest } from "./inputsDigest";
import { planInputs } from "./planInputs";
import { storePlan } from "./storePlan";
import { fail, ok, type Result } from "@/bending/core/result";
import { PLAN_ENGINE } from "@/bending/plan/emptyPlan";
import { database } from "@/db/client";
import { findSamePlan } from "@/db/plans/findSamePlan";
import type { Failure } from "@/lib/api/failure";
import type { SignedInPerson } from "@/lib/auth/signedInPerson";
import { planJobs } from "@/lib/jobs/planJobs";
import type { startPlanSchema } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Plans in the background; what was planned before from the same inputs is answered at once. */
export async function startPlan(person: SignedInPerson, input: z.output<typeof startPlanSchema>): Promise<Result<PlanJobView, Failure>> {
  const db = database();
  const inputs = await planInputs(db, input);
  if (!inputs.ok) return inputs;
  const digest = inputsDigest(PLAN_ENGINE, inputs.value.task);
  const same = await findSamePlan(db, inputs.value.revisionId, digest);
  if (same !== undefined) return ok(planJobs().finished(same));
  const job = planJobs().start({
    key: `${inputs.value.revisionId} ${digest}`,
    task: inputs.value.task,
    store: (plan) => storePlan(person, inputs.value, digest, plan),
  });
  return job ? ok(job) : fail({ kind: "busy", message: "Too many plans are waiting already. Try again in a minute.", retryAfterSeconds: 60 });
}
