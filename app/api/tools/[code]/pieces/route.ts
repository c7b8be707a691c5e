import { route } from "@/lib/api/route";
import { addPiecesSchema, toolCodeParams } from "@/lib/schemas/toolInputs";
import { addPieces } from "@/lib/services/tools/addPieces";

export const POST = route("POST /api/tools/[code]/pieces", {
  params: toolCodeParams,
  body: addPiecesSchema,
  status: 201,
  run: ({ person, params, body }) => addPieces(person, params.code, body),
});
