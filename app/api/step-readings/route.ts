import { route } from "@/lib/api/route";
import { stepReadingQuerySchema } from "@/lib/schemas/stepReading";
import { readStepFile } from "@/lib/services/parts/readStepFile";

export const POST = route("POST /api/step-readings", {
  query: stepReadingQuerySchema,
  run: ({ request, query }) => readStepFile(request, query.body ?? null),
});
