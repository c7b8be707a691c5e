import type { Situation } from "../plan/situation";
import { drawnBend } from "../strokes/drawnIds";

/** Ids of the drawn bends of a move; a bend that several strokes make stands for each of them. */
export const bendsOf = ({ part, moves }: Situation, move: number): readonly string[] =>
  [...new Set((moves[move]?.bends ?? []).map((bend) => drawnBend(part.bends[bend]?.id ?? "")))];
