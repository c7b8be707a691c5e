export type PieceRowState = "in rack" | "at brake" | "at regrind" | "withdrawn";

/** One physical piece, with the code of its tool and the name of the machine it stands at. */
export interface PieceRow {
  readonly id: string;
  readonly tool_code: string;
  readonly code: string;
  readonly length_mm: number;
  readonly horn: "left" | "right" | "both" | null;
  readonly rack: string;
  readonly state: PieceRowState;
  readonly machine_id: string | null;
  readonly machine_name: string | null;
}
