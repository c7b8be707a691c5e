import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "../connection";
import { findPieces } from "./findPieces";
import { inService } from "./inService";
import { toolFromRow } from "./toolFromRow";
import { toolColumnsCounted, toolQuery } from "./toolQuery";
import type { ToolRow } from "./toolRow";

/**
 * Every tool that has a piece in service, with those pieces only; by code, so that the same stock always reads the same.
 * With `at`, pieces that stand at another machine are promised there and left out.
 */
export async function findToolsInService(db: Connection, { at }: { readonly at?: string } = {}): Promise<readonly Tool[]> {
  const rows: ToolRow[] = await toolQuery(db).where("stock.pieces_in_service", ">", 0).select([...toolColumnsCounted(db)]).orderBy("tool.code");
  const pieces = (await findPieces(db, { toolCodes: rows.map((row) => row.code) }))
    .filter((piece) => inService.includes(piece.state) && (at === undefined || piece.machine_id === null || piece.machine_id === at));
  return rows.flatMap((row) => {
    const own = pieces.filter((piece) => piece.tool_code === row.code);
    return own.length === 0 ? [] : [toolFromRow(row, own)];
  });
}
