import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { finishPlanJob } from "@/lib/services/plans/finishPlanJob";

export const POST = route("POST /api/plan-jobs/[id]/finish", {
  params: idParams,
  run: ({ params }) => finishPlanJob(params.id),
});
