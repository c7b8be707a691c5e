import type { PieceRowState } from "./pieceRow";

export interface NewPiece {
  /** The shop's mark, unique over all tools. */
  readonly code: string;
  readonly lengthMm: number;
  readonly horn: "left" | "right" | "both" | null;
  readonly rack: string;
  /** `in rack` when absent. */
  readonly state?: PieceRowState;
  /** The machine it stands at; given exactly when the state is `at brake`. */
  readonly machineId?: string;
}
