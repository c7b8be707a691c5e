import type { FailurePlace } from "../plan/planFailure";
import { drawnBend } from "../strokes/drawnIds";
import type { WhySituation } from "./situationsOf";

/** Bends that may change sides of the stroke, at the most. */
const MOST_BENDS = 3;
/** Places that are named, at the most. */
const MOST_PLACES = 4;

/**
 * The least changes of place with which a stroke can be made, the bed left out: which of the bends made before it would have to come
 * after it, and which of the others before it. Only bends of `mask`, the ones that decide what is met, can matter.
 */
export function placesThatWork({ situation, works }: WhySituation, ways: readonly number[], formed: number, mask: number): readonly FailurePlace[] {
  const { part, moves } = situation;
  const own = ways.reduce((all, move) => all | (moves[move]?.mask ?? 0), 0);
  const bends = part.bends.flatMap((_, bend) => ((mask & ~own) >> bend & 1 ? [bend] : []));
  const found: number[] = [];
  for (const change of changesOf(bends)) {
    if (found.length >= MOST_PLACES) break;
    if (found.some((less) => (change & less) === less)) continue;
    if (ways.some((move) => works(move, formed ^ change))) found.push(change);
  }
  const names = (set: number) => [...new Set(part.bends.flatMap(({ id }, bend) => ((set >> bend) & 1 ? [drawnBend(id)] : [])))];
  return found.map((change) => ({ before: names(change & formed), after: names(change & ~formed) }));
}

/** Sets of up to so many of the bends, small ones first. */
function changesOf(bends: readonly number[]): readonly number[] {
  let level: readonly { readonly set: number; readonly from: number }[] = [{ set: 0, from: 0 }];
  const all: number[] = [];
  for (let size = 1; size <= MOST_BENDS; size += 1) {
    level = level.flatMap(({ set, from }) => bends.slice(from).map((bend, k) => ({ set: set | (1 << bend), from: from + k + 1 })));
    all.push(...level.map(({ set }) => set));
  }
  return all;
}
