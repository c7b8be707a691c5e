import { fail, ok, type Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";
import { planJobs } from "@/lib/jobs/planJobs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Ends a job that waits or runs; one that has ended already stays as it is. */
export async function cancelPlanJob(id: string): Promise<Result<PlanJobView, Failure>> {
  const job = planJobs().cancel(id);
  return job ? ok(job) : fail({ kind: "not-found", message: "This planning job is not known (any more)." });
}
