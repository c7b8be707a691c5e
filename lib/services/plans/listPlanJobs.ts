import type { z } from "zod";
import { planJobs } from "@/lib/jobs/planJobs";
import type { planJobListQuerySchema } from "@/lib/schemas/planInputs";
import type { PlanJobView } from "@/lib/schemas/views";

/** Jobs of this process that run or ended a while ago, newest first; of one part, or about one plan. */
export function listPlanJobs({ partId, planId }: z.output<typeof planJobListQuerySchema>): readonly PlanJobView[] {
  return planJobs().list().filter((job) => (partId === undefined || job.partId === partId) && (planId === undefined || job.fromPlanId === planId));
}
