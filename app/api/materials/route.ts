import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { createMaterialSchema } from "@/lib/schemas/materialInputs";
import { createMaterial } from "@/lib/services/materials/createMaterial";
import { listMaterials } from "@/lib/services/materials/listMaterials";

export const GET = route("GET /api/materials", { run: async () => ok(await listMaterials()) });

export const POST = route("POST /api/materials", {
  body: createMaterialSchema,
  status: 201,
  run: ({ person, body }) => createMaterial(person, body),
});
