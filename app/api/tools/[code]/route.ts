import { route } from "@/lib/api/route";
import { toolCodeParams, updateToolSchema } from "@/lib/schemas/toolInputs";
import { getTool } from "@/lib/services/tools/getTool";
import { updateTool } from "@/lib/services/tools/updateTool";

export const GET = route("GET /api/tools/[code]", {
  params: toolCodeParams,
  run: ({ params }) => getTool(params.code),
});

export const PATCH = route("PATCH /api/tools/[code]", {
  params: toolCodeParams,
  body: updateToolSchema,
  run: ({ person, params, body }) => updateTool(person, params.code, body),
});
