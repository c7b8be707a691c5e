import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { listMachines } from "@/lib/services/listMachines";

export const GET = route("GET /api/machines", { run: async () => ok(await listMachines()) });
