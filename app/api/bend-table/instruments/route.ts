import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { instrumentSchema } from "@/lib/schemas/bendTableInputs";
import { createInstrument } from "@/lib/services/bendTable/createInstrument";
import { listInstruments } from "@/lib/services/bendTable/listInstruments";

export const GET = route("GET /api/bend-table/instruments", {
  run: async () => ok(await listInstruments()),
});

export const POST = route("POST /api/bend-table/instruments", {
  body: instrumentSchema,
  status: 201,
  run: ({ person, body }) => createInstrument(person, body),
});
