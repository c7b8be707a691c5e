import { fail, ok, type Result } from "@/bending/core/result";
import type { Failure } from "@/lib/api/failure";
import { planJobs } from "@/lib/jobs/planJobs";
import type { PlanJobView } from "@/lib/schemas/views";

export async function getPlanJob(id: string): Promise<Result<PlanJobView, Failure>> {
  const job = planJobs().find(id);
  return job ? ok(job) : fail({ kind: "not-found", message: "This planning job is not known (any more); the server may have been started anew. Start the plan again." });
}
