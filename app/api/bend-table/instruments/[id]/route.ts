import { route } from "@/lib/api/route";
import { withdrawInstrumentSchema } from "@/lib/schemas/bendTableInputs";
import { idParams } from "@/lib/schemas/idParams";
import { withdrawInstrument } from "@/lib/services/bendTable/withdrawInstrument";

export const PATCH = route("PATCH /api/bend-table/instruments/[id]", {
  params: idParams,
  body: withdrawInstrumentSchema,
  run: ({ person, params, body }) => withdrawInstrument(person, params.id, body.reason),
});
