import type { PieceRow } from "@/db/tools/pieceRow";
import type { PieceView } from "@/lib/schemas/views";

export const pieceView = (row: PieceRow): PieceView => ({
  id: row.id,
  code: row.code,
  lengthMm: row.length_mm,
  horn: row.horn,
  rack: row.rack,
  state: row.state,
  machine: row.machine_name,
});
