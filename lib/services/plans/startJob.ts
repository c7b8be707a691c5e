import { fail, ok, type Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";
import type { PlanJobFacts } from "@/lib/jobs/createPlanJobs";
import { planJobs } from "@/lib/jobs/planJobs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Starts a job in the background, or says that too many wait. */
export function startJob(facts: PlanJobFacts): Result<PlanJobView, Failure> {
  const job = planJobs().start(facts);
  return job ? ok(job) : fail({ kind: "busy", message: "Too many plans are waiting already. Try again in a minute.", retryAfterSeconds: 60 });
}
