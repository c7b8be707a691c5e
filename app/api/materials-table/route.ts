import { route } from "@/lib/api/route";
import { csvLimits } from "@/lib/csv/csvLimits";
import { csvImportSchema } from "@/lib/schemas/csvImport";
import { csvExportQuerySchema } from "@/lib/schemas/materialInputs";
import { exportMaterials } from "@/lib/services/materials/exportMaterials";
import { importMaterials } from "@/lib/services/materials/importMaterials";

export const GET = route("GET /api/materials-table", {
  query: csvExportQuerySchema,
  run: async ({ query }) => new Response(await exportMaterials(query.separator), {
    headers: { "content-type": "text/csv; charset=utf-8", "content-disposition": 'attachment; filename="materials.csv"', "cache-control": "no-store" },
  }),
});

export const POST = route("POST /api/materials-table", {
  body: csvImportSchema,
  bodyLimit: csvLimits.bodyBytes,
  run: ({ person, body }) => importMaterials(person, body),
});
