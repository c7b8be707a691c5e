import { route } from "@/lib/api/route";
import { valueParams } from "@/lib/schemas/bendTableInputs";
import { getValue } from "@/lib/services/bendTable/getValue";

export const GET = route("GET /api/bend-table/values/[key]", {
  params: valueParams,
  run: ({ params }) => getValue(params.key),
});
