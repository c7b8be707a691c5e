import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { updatePieceSchema } from "@/lib/schemas/toolInputs";
import { updatePiece } from "@/lib/services/tools/updatePiece";

export const PATCH = route("PATCH /api/pieces/[id]", {
  params: idParams,
  body: updatePieceSchema,
  run: ({ person, params, body }) => updatePiece(person, params.id, body),
});
