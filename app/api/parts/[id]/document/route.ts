import { route } from "@/lib/api/route";
import { partFileName } from "@/lib/format/partFileName";
import { idParams } from "@/lib/schemas/idParams";
import { revisionQuerySchema } from "@/lib/schemas/partInputs";
import { getPart } from "@/lib/services/parts/getPart";

/** The part document alone, as a file to keep. */
export const GET = route("GET /api/parts/[id]/document", {
  params: idParams,
  query: revisionQuerySchema,
  run: async ({ person, params, query }) => {
    const part = await getPart(person, params.id, query.revision);
    if (!part.ok) return part;
    const { number, revision, document } = part.value;
    return Response.json(document, { headers: { "cache-control": "no-store", "content-disposition": `attachment; filename="${partFileName(number, revision.revision, "json")}"` } });
  },
});
