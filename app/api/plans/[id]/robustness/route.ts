import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { findRobustness } from "@/lib/services/plans/findRobustness";

export const POST = route("POST /api/plans/[id]/robustness", {
  params: idParams,
  status: 202,
  run: ({ person, params }) => findRobustness(person, params.id),
});
