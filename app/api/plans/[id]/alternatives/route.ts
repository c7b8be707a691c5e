import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { chooseAlternativeSchema } from "@/lib/schemas/planInputs";
import { chooseAlternative } from "@/lib/services/plans/chooseAlternative";

export const POST = route("POST /api/plans/[id]/alternatives", {
  params: idParams,
  body: chooseAlternativeSchema,
  status: 201,
  run: ({ person, params, body }) => chooseAlternative(person, params.id, body),
});
