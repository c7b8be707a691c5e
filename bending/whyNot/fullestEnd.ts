import { bitCount } from "../order/bitCount";
import type { WhySituation } from "./situationsOf";

/** The state with most bends formed from which no stroke goes on, each stroke asked with the bed left out. */
export interface FullestEnd {
  readonly formed: number;
  /** Moves that lead there, in order. */
  readonly way: readonly number[];
}

/** Null when an order reaches the finished part (or the search was stopped before it knew). */
export function fullestEnd({ situation, works, follows }: WhySituation, shouldStop: () => boolean): FullestEnd | null {
  const { moves, part } = situation;
  const all = 2 ** part.bends.length - 1;
  const before = new Map<number, { readonly from: number; readonly move: number } | null>([[0, null]]);
  const waiting = [0];
  const ends: number[] = [];
  for (let formed = waiting.pop(); formed !== undefined; formed = waiting.pop()) {
    let any = false;
    for (let move = 0; move < moves.length; move += 1) {
      const mask = moves[move]?.mask ?? 0;
      if (shouldStop()) return null;
      if (mask & formed || !follows(move, formed) || !works(move, formed)) continue;
      any = true;
      const next = formed | mask;
      if (next === all) return null;
      if (before.has(next)) continue;
      before.set(next, { from: formed, move });
      waiting.push(next);
    }
    if (!any) ends.push(formed);
  }
  const fullest = ends.sort((a, b) => bitCount(b) - bitCount(a) || a - b)[0] ?? 0;
  const way: number[] = [];
  for (let step = before.get(fullest) ?? null; step !== null; step = before.get(step.from) ?? null) way.unshift(step.move);
  return { formed: fullest, way };
}
