import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { addTrialsSchema, trialListQuerySchema } from "@/lib/schemas/bendTableInputs";
import { addTrials } from "@/lib/services/bendTable/addTrials";
import { listTrials } from "@/lib/services/bendTable/listTrials";

export const GET = route("GET /api/bend-table/trials", {
  query: trialListQuerySchema,
  run: async ({ query }) => ok(await listTrials(query)),
});

export const POST = route("POST /api/bend-table/trials", {
  body: addTrialsSchema,
  status: 201,
  run: ({ person, body }) => addTrials(person, body),
});
