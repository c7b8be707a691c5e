import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { releaseSheet } from "@/lib/services/sheets/releaseSheet";

export const POST = route("POST /api/sheets/[id]/release", {
  params: idParams,
  run: ({ person, params }) => releaseSheet(person, params.id),
});
