import { route } from "@/lib/api/route";
import { idParams } from "@/lib/schemas/idParams";
import { ownOrderSchema } from "@/lib/schemas/planInputs";
import { planOwnOrder } from "@/lib/services/plans/planOwnOrder";

export const POST = route("POST /api/plans/[id]/order", {
  params: idParams,
  body: ownOrderSchema,
  status: 202,
  run: ({ person, params, body }) => planOwnOrder(person, params.id, body),
});
