import { fail, ok, type Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";
import { planJobs } from "@/lib/jobs/planJobs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Has a running job end with the best so far; one that has ended already stays as it is. */
export async function finishPlanJob(id: string): Promise<Result<PlanJobView, Failure>> {
  const job = planJobs().finish(id);
  return job ? ok(job) : fail({ kind: "not-found", message: "This planning job is not known (any more)." });
}
