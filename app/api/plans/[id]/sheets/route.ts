import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { createSheet } from "@/lib/services/sheets/createSheet";

export const POST = route("POST /api/plans/[id]/sheets", {
  params: idParams,
  status: 201,
  run: ({ person, params }) => createSheet(person, params.id),
});
