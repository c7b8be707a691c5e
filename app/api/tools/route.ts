import { ok } from "@/bending/core/result";
import { route } from "@/lib/api/route";
import { toolListQuerySchema, toolSchema } from "@/lib/schemas/toolInputs";
import { createTool } from "@/lib/services/tools/createTool";
import { listTools } from "@/lib/services/tools/listTools";

export const GET = route("GET /api/tools", {
  query: toolListQuerySchema,
  run: async ({ query }) => ok(await listTools(query)),
});

export const POST = route("POST /api/tools", {
  body: toolSchema,
  status: 201,
  run: ({ person, body }) => createTool(person, body),
});
