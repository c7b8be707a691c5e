import { noSuchTool } from "./noSuchTool";
import { toolDetail } from "./toolDetail";
import { ok, type Result } from "@/bending/core/result";
import { database } from "@/db/client";
import type { Failure } from "@/lib/api/failure";
import type { ToolDetail } from "@/lib/schemas/views";

export async function getTool(code: string): Promise<Result<ToolDetail, Failure>> {
  const tool = await toolDetail(database(), code);
  return tool ? ok(tool) : noSuchTool(code);
}
