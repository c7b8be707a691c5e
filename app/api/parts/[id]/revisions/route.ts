import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { addRevisionSchema } from "@/lib/schemas/partInputs";
import { addRevision } from "@/lib/services/parts/addRevision";

export const POST = route("POST /api/parts/[id]/revisions", {
  params: idParams,
  body: addRevisionSchema,
  status: 201,
  run: ({ person, params, body }) => addRevision(person, params.id, body),
});
