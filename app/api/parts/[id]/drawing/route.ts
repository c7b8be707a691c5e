import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { drawingQuerySchema } from "@/lib/schemas/partInputs";
import { partDrawing } from "@/lib/services/parts/partDrawing";

/** The flat as DXF or SVG, or the folded part as GLB, as a file to keep. */
export const GET = route("GET /api/parts/[id]/drawing", {
  params: idParams,
  query: drawingQuerySchema,
  run: async ({ person, params, query }) => {
    const drawn = await partDrawing(person, params.id, query);
    if (!drawn.ok) return drawn;
    const { content, mediaType, name } = drawn.value;
    const body = typeof content === "string" ? content : new Uint8Array(content).buffer;
    return new Response(body, { headers: { "content-type": mediaType, "cache-control": "no-store", "content-disposition": `attachment; filename="${name}"` } });
  },
});
