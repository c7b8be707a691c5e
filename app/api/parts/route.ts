import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { createPartSchema, partListQuerySchema } from "@/lib/schemas/partInputs";
import { createPart } from "@/lib/services/parts/createPart";
import { listParts } from "@/lib/services/parts/listParts";

export const GET = route("GET /api/parts", {
  query: partListQuerySchema,
  run: async ({ query }) => ok(await listParts(query)),
});

export const POST = route("POST /api/parts", {
  body: createPartSchema,
  status: 201,
  run: ({ person, body }) => createPart(person, body),
});
