import type { Connection } from "../connection";
import { toolColumnsCounted, toolQuery } from "./toolQuery";
import type { ToolRow } from "./toolRow";

export async function findTool(db: Connection, code: string): Promise<ToolRow | undefined> {
  const rows: ToolRow[] = await toolQuery(db).where("tool.code", code).select([...toolColumnsCounted(db)]);
  return rows[0];
}
