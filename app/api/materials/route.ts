import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { listMaterials } from "@/lib/services/materials/listMaterials";

export const GET = route("GET /api/materials", { run: async () => ok(await listMaterials()) });
