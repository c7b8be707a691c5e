import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "../connection";
import { insertPieces } from "./insertPieces";
import type { NewPiece } from "./newPiece";
import { toolColumns } from "./toolColumns";

/** Puts in a tool with its pieces, all or nothing: those given, else the tool's own, all in the rack. */
export async function insertTool(db: Connection, tool: Tool, pieces: readonly NewPiece[] = piecesOf(tool)): Promise<string> {
  return db.transaction(async (within) => {
    const [row] = await within("tools").insert(toolColumns(tool)).returning<{ id: string }[]>("id");
    await insertPieces(within, row!.id, pieces);
    return row!.id;
  });
}

const piecesOf = (tool: Tool): readonly NewPiece[] =>
  tool.pieces.map((piece) => ({ code: piece.id, lengthMm: piece.length, horn: piece.horn, rack: piece.rack ?? "" }));
