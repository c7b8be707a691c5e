import { DEMERIT_SECONDS, type OrderProblem } from "./orderProblem";
import { stepSeconds } from "./stepSeconds";

export interface CostToGo {
  /** Least weight from the state to the finished part; Infinity when there is no way. `move` is the last one, null at the start. */
  readonly from: (formed: number, move: number | null) => number;
  /** Sets of formed bends in which no move can be made, fullest first. */
  readonly deadEnds: () => readonly number[];
  readonly states: () => number;
  /** Every set of formed bends that an order can come to, the full one left out; ascending. */
  readonly sets: () => readonly number[];
  /** The cheapest moves from the start; empty when there is no way. */
  readonly moves: () => readonly { readonly move: number; readonly formed: number }[];
}

/** Thrown through the recursion when the caller wants to stop; never leaves `createCostToGo`. */
class Stopped extends Error {}

/**
 * Exact cost to go of a one-station problem by dynamic programming over (formed set, last move), depth first and
 * only where an order can come to; null when stopped.
 */
export function createCostToGo(problem: OrderProblem, shouldStop: () => boolean): CostToGo | null {
  const all = 2 ** problem.bends - 1;
  const known = new Map<number, number>();
  const dead = new Set<number>();
  const count = problem.moves.length + 1;
  const maskOf = (move: number) => problem.moves[move]?.mask ?? 0;
  const gaugeOf = (formed: number, move: number) => problem.option(move, formed & ~maskOf(move), 0)?.gauge ?? 0;
  const step = (formed: number, last: number | null, move: number): number | null => {
    if (maskOf(move) & formed) return null;
    const option = problem.option(move, formed, 0);
    if (option === null) return null;
    const before = last === null ? null : { move: last, station: 0, gauge: gaugeOf(formed, last) };
    return stepSeconds(problem, before, { move, station: 0, gauge: option.gauge }) + option.demerit * DEMERIT_SECONDS;
  };
  const from = (formed: number, last: number | null): number => {
    if (formed === all) return 0;
    const key = formed * count + (last ?? count - 1);
    const answer = known.get(key);
    if (answer !== undefined) return answer;
    let best = Infinity;
    let any = false;
    for (let move = 0; move < problem.moves.length; move += 1) {
      if (shouldStop()) throw new Stopped();
      const seconds = step(formed, last, move);
      if (seconds === null) continue;
      any = true;
      best = Math.min(best, seconds + from(formed | maskOf(move), move));
    }
    if (!any) dead.add(formed);
    known.set(key, best);
    return best;
  };
  try {
    from(0, null);
  } catch (error) {
    if (error instanceof Stopped) return null;
    throw error;
  }
  const cheapest = (): { readonly move: number; readonly formed: number }[] => {
    const chosen: { readonly move: number; readonly formed: number }[] = [];
    let [formed, last]: [number, number | null] = [0, null];
    while (formed !== all && Number.isFinite(from(formed, last))) {
      const ways = problem.moves.flatMap((_, move) => {
        const seconds = step(formed, last, move);
        return seconds === null ? [] : [{ move, weight: seconds + from(formed | maskOf(move), move) }];
      });
      const best = ways.reduce((a, b) => (b.weight < a.weight - 1e-9 ? b : a));
      chosen.push({ move: best.move, formed });
      formed |= maskOf(best.move);
      last = best.move;
    }
    return chosen;
  };
  return {
    from,
    deadEnds: () => [...dead].sort((a, b) => bits(b) - bits(a) || a - b),
    states: () => known.size,
    sets: () => [...new Set([...known.keys()].map((key) => Math.floor(key / count)))].sort((a, b) => a - b),
    moves: cheapest,
  };
}

function bits(set: number): number {
  let count = 0;
  for (let rest = set; rest !== 0; rest &= rest - 1) count += 1;
  return count;
}
