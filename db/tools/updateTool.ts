import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "../connection";
import { toolColumns } from "./toolColumns";

/** Replaces what a tool is; its code and its pieces stay. Answers false when there is no such tool. */
export async function updateTool(db: Connection, code: string, tool: Tool): Promise<boolean> {
  const changed = await db("tools").where({ code }).update({ ...toolColumns(tool), code, updated_at: db.fn.now() });
  return changed === 1;
}
