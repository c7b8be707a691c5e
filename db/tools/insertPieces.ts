import type { Connection } from "../connection";
import type { NewPiece } from "./newPiece";

export async function insertPieces(db: Connection, toolId: string, pieces: readonly NewPiece[]): Promise<readonly string[]> {
  if (pieces.length === 0) return [];
  const rows = await db("tool_pieces")
    .insert(pieces.map((piece) => ({
      tool_id: toolId,
      code: piece.code,
      length_mm: piece.lengthMm,
      horn: piece.horn,
      rack: piece.rack,
      state: piece.state ?? "in rack",
      machine_id: piece.machineId ?? null,
    })))
    .returning<{ id: string }[]>("id");
  return rows.map((row) => row.id);
}
