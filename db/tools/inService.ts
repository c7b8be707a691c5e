import type { PieceRowState } from "./pieceRow";

/** The states of a piece that a plan may count on. */
export const inService: readonly PieceRowState[] = ["in rack", "at brake"];
