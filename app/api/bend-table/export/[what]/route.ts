import { route } from "@/lib/api/route";
import { exportParams, exportQuerySchema } from "@/lib/schemas/bendTableInputs";
import { exportTrials } from "@/lib/services/bendTable/exportTrials";
import { exportValues } from "@/lib/services/bendTable/exportValues";

export const GET = route("GET /api/bend-table/export/[what]", {
  params: exportParams,
  query: exportQuerySchema,
  run: async ({ params, query }) => {
    const write = params.what === "trials" ? exportTrials : exportValues;
    const text = await write(query.material, query.separator === "semicolon" ? ";" : ",");
    return new Response(text, {
      headers: { "content-type": "text/csv; charset=utf-8", "content-disposition": `attachment; filename="bend-${params.what}.csv"`, "cache-control": "no-store" },
    });
  },
});
