import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { findChangesSchema } from "@/lib/schemas/planInputs";
import { findChanges } from "@/lib/services/plans/findChanges";

export const POST = route("POST /api/plans/[id]/changes", {
  params: idParams,
  body: findChangesSchema,
  status: 202,
  run: ({ person, params, body }) => findChanges(person, params.id, body),
});
