import { renderSheetPdf } from "@/components/sheets/renderSheetPdf";
import { route } from "@/lib/api/route";
import { publicAddress } from "@/lib/api/publicAddress";
import { idParams } from "@/lib/schemas/idParams";
import { releasedText } from "@/lib/sheet/releasedText";
import { getSheet } from "@/lib/services/sheets/getSheet";

export const GET = route("GET /api/sheets/[id]/pdf", {
  params: idParams,
  run: async ({ person, params, request }) => {
    const found = await getSheet(person, params.id);
    if (!found.ok) return found;
    const { view, state, id, number } = found.value;
    const file = await renderSheetPdf({ view, state, released: releasedText(found.value), address: `${publicAddress(request.headers, request.url)}/floor/${id}` });
    return new Response(file, {
      headers: { "content-type": "application/pdf", "content-disposition": `inline; filename="setup-sheet-${number.replace(/[^\w.-]/g, "_")}.pdf"`, "cache-control": "no-store" },
    });
  },
});
