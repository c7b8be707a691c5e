import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { peopleQuerySchema } from "@/lib/schemas/peopleQuery";
import { listPeople } from "@/lib/services/listPeople";

export const GET = route("GET /api/people", {
  query: peopleQuerySchema,
  run: async ({ query }) => ok(await listPeople(query)),
});
