import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { planListQuerySchema, startPlanSchema } from "@/lib/schemas/planInputs";
import { listPlans } from "@/lib/services/plans/listPlans";
import { startPlan } from "@/lib/services/plans/startPlan";

export const GET = route("GET /api/plans", {
  query: planListQuerySchema,
  run: async ({ query }) => ok(await listPlans(query)),
});

export const POST = route("POST /api/plans", {
  body: startPlanSchema,
  status: 202,
  run: ({ person, body }) => startPlan(person, body),
});
