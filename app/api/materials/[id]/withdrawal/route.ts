import { route } from "@/lib/api/route";
import { materialIdParams, withdrawMaterialSchema } from "@/lib/schemas/materialInputs";
import { withdrawMaterial } from "@/lib/services/materials/withdrawMaterial";

export const POST = route("POST /api/materials/[id]/withdrawal", {
  params: materialIdParams,
  body: withdrawMaterialSchema,
  run: ({ person, params, body }) => withdrawMaterial(person, params.id, body),
});
