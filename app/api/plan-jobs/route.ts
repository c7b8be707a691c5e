import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { planJobListQuerySchema } from "@/lib/schemas/planInputs";
import { listPlanJobs } from "@/lib/services/plans/listPlanJobs";

export const GET = route("GET /api/plan-jobs", {
  query: planJobListQuerySchema,
  run: async ({ query }) => ok(listPlanJobs(query)),
});
