import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { getSheet } from "@/lib/services/sheets/getSheet";

export const GET = route("GET /api/sheets/[id]", {
  params: idParams,
  run: ({ person, params }) => getSheet(person, params.id),
});
