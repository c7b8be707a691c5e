import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { revisionQuerySchema } from "@/lib/schemas/partInputs";
import { deletePart } from "@/lib/services/parts/deletePart";
import { getPart } from "@/lib/services/parts/getPart";

export const GET = route("GET /api/parts/[id]", {
  params: idParams,
  query: revisionQuerySchema,
  run: ({ person, params, query }) => getPart(person, params.id, query.revision),
});

export const DELETE = route("DELETE /api/parts/[id]", {
  params: idParams,
  run: ({ person, params }) => deletePart(person, params.id),
});
