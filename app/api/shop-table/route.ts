import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { shopTableQuerySchema } from "@/lib/schemas/shopTableQuery";
import { getShopTable } from "@/lib/services/bendTable/getShopTable";

export const GET = route("GET /api/shop-table", {
  query: shopTableQuerySchema,
  run: async ({ query }) => ok(await getShopTable(query.material)),
});
