import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { sheetListQuerySchema } from "@/lib/schemas/sheetInputs";
import { listSheets } from "@/lib/services/sheets/listSheets";

export const GET = route("GET /api/sheets", {
  query: sheetListQuerySchema,
  run: async ({ person, query }) => ok(await listSheets(person, query)),
});
