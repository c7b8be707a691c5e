import { pieceView } from "./pieceView";
import { toolListItem } from "./toolListItem";
import type { Connection } from "@/db/connection";
import { findPieces } from "@/db/tools/findPieces";
import { findTool } from "@/db/tools/findTool";
import type { ToolDetail } from "@/lib/schemas/views";

export async function toolDetail(db: Connection, code: string): Promise<ToolDetail | undefined> {
  const row = await findTool(db, code);
  if (!row) return undefined;
  const pieces = await findPieces(db, { toolCodes: [code] });
  return { ...toolListItem(row), tang: row.tang, profile: row.profile, flattening: row.flattening, pieceList: pieces.map(pieceView), updatedAt: row.updated_at.toISOString() };
}
