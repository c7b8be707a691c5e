import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { valueListQuerySchema } from "@/lib/schemas/bendTableInputs";
import { listValues } from "@/lib/services/bendTable/listValues";

export const GET = route("GET /api/bend-table", {
  query: valueListQuerySchema,
  run: async ({ query }) => ok(await listValues(query)),
});
