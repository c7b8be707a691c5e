import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { activityQuerySchema } from "@/lib/schemas/activityQuery";
import { listActivity } from "@/lib/services/listActivity";

export const GET = route("GET /api/activity", {
  query: activityQuerySchema,
  run: async ({ query }) => ok(await listActivity(query)),
});
