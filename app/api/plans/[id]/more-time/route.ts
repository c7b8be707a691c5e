import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { searchOnSchema } from "@/lib/schemas/planInputs";
import { searchOn } from "@/lib/services/plans/searchOn";

export const POST = route("POST /api/plans/[id]/more-time", {
  params: idParams,
  body: searchOnSchema,
  status: 202,
  run: ({ person, params, body }) => searchOn(person, params.id, body),
});
