import { route } from "@/lib/api/route";
import { coverageQuerySchema } from "@/lib/schemas/bendTableInputs";
import { getCoverage } from "@/lib/services/bendTable/getCoverage";

export const GET = route("GET /api/bend-table/coverage", {
  query: coverageQuerySchema,
  run: ({ query }) => getCoverage(query.material),
});
