import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "../connection";
import { findPieces } from "./findPieces";
import { inService } from "./inService";
import { toolFromRow } from "./toolFromRow";
import { toolColumnsCounted, toolQuery } from "./toolQuery";
import type { ToolRow } from "./toolRow";

/** Every tool that has a piece in service, with those pieces only; by code, so that the same stock always reads the same. */
export async function findToolsInService(db: Connection): Promise<readonly Tool[]> {
  const rows: ToolRow[] = await toolQuery(db).where("stock.pieces_in_service", ">", 0).select([...toolColumnsCounted(db)]).orderBy("tool.code");
  const pieces = await findPieces(db, { toolCodes: rows.map((row) => row.code) });
  return rows.map((row) =>
    toolFromRow(row, pieces.filter((piece) => piece.tool_code === row.code && inService.includes(piece.state))));
}
