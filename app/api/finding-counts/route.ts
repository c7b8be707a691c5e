import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { findingCountsQuerySchema } from "@/lib/schemas/findingCounts";
import { findingCounts } from "@/lib/services/parts/findingCounts";

/** Findings of parts in a list, counted. */
export const GET = route("GET /api/finding-counts", {
  query: findingCountsQuerySchema,
  run: async ({ query }) => ok(await findingCounts(query.ids)),
});
