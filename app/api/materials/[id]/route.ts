import { route } from "@/lib/api/route";
import { materialIdParams, updateMaterialSchema } from "@/lib/schemas/materialInputs";
import { getMaterial } from "@/lib/services/materials/getMaterial";
import { updateMaterial } from "@/lib/services/materials/updateMaterial";

export const GET = route("GET /api/materials/[id]", {
  params: materialIdParams,
  run: ({ params }) => getMaterial(params.id),
});

export const PATCH = route("PATCH /api/materials/[id]", {
  params: materialIdParams,
  body: updateMaterialSchema,
  run: ({ person, params, body }) => updateMaterial(person, params.id, body),
});
