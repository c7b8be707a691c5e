import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { cancelPlanJob } from "@/lib/services/plans/cancelPlanJob";
import { getPlanJob } from "@/lib/services/plans/getPlanJob";

export const GET = route("GET /api/plan-jobs/[id]", {
  params: idParams,
  run: ({ params }) => getPlanJob(params.id),
});

export const DELETE = route("DELETE /api/plan-jobs/[id]", {
  params: idParams,
  run: ({ params }) => cancelPlanJob(params.id),
});
