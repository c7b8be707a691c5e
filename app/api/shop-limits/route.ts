import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { shopLimits } from "@/lib/services/parts/shopLimits";

export const GET = route("GET /api/shop-limits", { run: async () => ok(await shopLimits()) });
