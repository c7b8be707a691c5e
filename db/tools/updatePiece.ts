import type { Connection } from "../connection";
import type { PieceRowState } from "./pieceRow";

export interface PieceChange {
  readonly state?: PieceRowState | undefined;
  /** Set with the state `at brake`; taken away by every other state. */
  readonly machineId?: string | undefined;
  readonly rack?: string | undefined;
  readonly lengthMm?: number | undefined;
}

export async function updatePiece(db: Connection, id: string, change: PieceChange): Promise<boolean> {
  const changed = await db("tool_pieces").where({ id }).update({
    ...(change.state === undefined ? {} : { state: change.state, machine_id: change.state === "at brake" ? change.machineId ?? null : null }),
    ...(change.rack === undefined ? {} : { rack: change.rack }),
    ...(change.lengthMm === undefined ? {} : { length_mm: change.lengthMm }),
    updated_at: db.fn.now(),
  });
  return changed === 1;
}
