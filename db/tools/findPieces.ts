import type { Connection } from "../connection";
import type { PieceRow } from "./pieceRow";

/** Pieces of the tools (by code) or by their own ids; longest first, then by code. */
export async function findPieces(db: Connection, by: { readonly toolCodes: readonly string[] } | { readonly ids: readonly string[] }): Promise<readonly PieceRow[]> {
  return db("tool_pieces as piece")
    .join("tools as tool", "tool.id", "piece.tool_id")
    .leftJoin("machines as machine", "machine.id", "piece.machine_id")
    .whereIn("toolCodes" in by ? "tool.code" : "piece.id", "toolCodes" in by ? by.toolCodes : by.ids)
    .select<PieceRow[]>("piece.id", "tool.code as tool_code", "piece.code", "piece.length_mm", "piece.horn", "piece.rack", "piece.state",
      "piece.machine_id", "machine.name as machine_name")
    .orderBy([{ column: "tool.code" }, { column: "piece.length_mm", order: "desc" }, { column: "piece.code" }]);
}
