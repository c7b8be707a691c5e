import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { getPlanShop } from "@/lib/services/plans/getPlanShop";

export const GET = route("GET /api/plans/[id]/shop", {
  params: idParams,
  run: ({ params }) => getPlanShop(params.id),
});
