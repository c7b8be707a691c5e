import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { getPlan } from "@/lib/services/plans/getPlan";

export const GET = route("GET /api/plans/[id]", {
  params: idParams,
  run: ({ person, params }) => getPlan(person, params.id),
});
