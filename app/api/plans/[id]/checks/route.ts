import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { checkPlan } from "@/lib/services/plans/checkPlan";

export const POST = route("POST /api/plans/[id]/checks", {
  params: idParams,
  status: 202,
  run: ({ person, params }) => checkPlan(person, params.id),
});
