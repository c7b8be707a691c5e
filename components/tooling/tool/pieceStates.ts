import type { StateTone } from "@/components/ui/StateMark";
import type { PieceState } from "@/lib/schemas/views";

export const pieceTone: Readonly<Record<PieceState, StateTone>> = { "in rack": "good", "at brake": "note", "at regrind": "caution", withdrawn: "stop" };
