import TinyQueue from "tinyqueue";
import { DEMERIT_SECONDS, MAX_BENDS, type OrderProblem, type OrderStep } from "./orderProblem";
import { remainingBound } from "./remainingBound";
import { stepSeconds } from "./stepSeconds";

export interface SearchLimits {
  /** Only plans cheaper than this (demerits weighed in) are looked for. */
  readonly under?: number;
  readonly shouldStop?: () => boolean;
  /** A better bound from below on what is left after a move, if one is known; consistent, Infinity where nothing can follow. */
  readonly toGo?: (formed: number, move: number) => number;
  readonly onExpand?: (expanded: number) => void;
}

export type OrderOutcome =
  | { readonly kind: "found"; readonly steps: readonly OrderStep[]; readonly seconds: number; readonly demerits: number; readonly weight: number; readonly expanded: number }
  | { readonly kind: "none"; /** Sets of formed bends from which nothing goes on, fullest first. */ readonly deadEnds: readonly number[]; readonly pruned: boolean; readonly expanded: number }
  | { readonly kind: "stopped"; /** No plan weighs less. */ readonly bound: number; readonly expanded: number };

interface Node {
  readonly formed: number;
  readonly move: number;
  readonly station: number;
  readonly gauge: number;
  readonly weight: number;
  readonly demerits: number;
  readonly total: number;
  /** Strokes so far: of equal totals the one nearer to the end goes first. */
  readonly depth: number;
  readonly serial: number;
  readonly before: Node | null;
}

/** Seconds; two totals nearer than this are equal: over rounding noise, under anything a clock shows. */
const SAME_SECONDS = 1e-7;

/**
 * Best first over (formed set, last move, station), each state kept once with its cheapest way: exact, since
 * what a step costs depends on nothing else of the past. The first full set taken from the queue is optimal.
 */
export function searchOrder(problem: OrderProblem, limits: SearchLimits = {}): OrderOutcome {
  if (problem.bends > MAX_BENDS) throw new Error(`invariant: at most ${MAX_BENDS} bends`);
  const all = 2 ** problem.bends - 1;
  const bound = remainingBound(problem);
  const best = new Map<number, number>();
  const queue = new TinyQueue<Node>([], (a, b) => (Math.abs(a.total - b.total) > SAME_SECONDS ? a.total - b.total : b.depth - a.depth || a.serial - b.serial));
  const under = limits.under ?? Infinity;
  const deadEnds = new Set<number>();
  let expanded = 0;
  let serial = 0;
  let pruned = false;
  let stopped = false;

  const expand = (node: Node | null): void => {
    const formed = node === null ? 0 : node.formed;
    let any = false;
    for (let move = 0; move < problem.moves.length; move += 1) {
      const mask = problem.moves[move]?.mask ?? 0;
      if (mask & formed) continue;
      if (limits.shouldStop?.()) { stopped = true; return; }
      for (let station = 0; station < problem.stations; station += 1) {
        const option = problem.option(move, formed, station);
        if (option === null) continue;
        any = true;
        const seconds = stepSeconds(problem, node, { move, station, gauge: option.gauge });
        const weight = (node?.weight ?? 0) + seconds + option.demerit * DEMERIT_SECONDS;
        const next = formed | mask;
        const total = weight + (limits.toGo?.(next, move) ?? bound(all & ~next, problem.moves[move]?.pose ?? null));
        if (total >= under - SAME_SECONDS) { pruned = true; continue; }
        const key = (next * problem.moves.length + move) * problem.stations + station;
        const known = best.get(key);
        if (known !== undefined && known <= weight + SAME_SECONDS) continue;
        best.set(key, weight);
        serial += 1;
        queue.push({ formed: next, move, station, gauge: option.gauge, weight, demerits: (node?.demerits ?? 0) + option.demerit, total, depth: (node?.depth ?? 0) + 1, serial, before: node });
      }
    }
    if (!any) deadEnds.add(formed);
  };

  expand(null);
  if (stopped) return { kind: "stopped", bound: bound(all, null), expanded };
  for (let node = queue.pop(); node !== undefined; node = queue.pop()) {
    const key = (node.formed * problem.moves.length + node.move) * problem.stations + node.station;
    if ((best.get(key) ?? Infinity) < node.weight - SAME_SECONDS) continue;
    if (node.formed === all) return found(node, expanded);
    expanded += 1;
    limits.onExpand?.(expanded);
    expand(node);
    if (stopped) return { kind: "stopped", bound: node.total, expanded };
  }
  return { kind: "none", deadEnds: [...deadEnds].sort((a, b) => bitCount(b) - bitCount(a) || a - b), pruned, expanded };
}

function found(goal: Node, expanded: number): OrderOutcome {
  const steps: OrderStep[] = [];
  for (let node: Node | null = goal; node !== null; node = node.before) {
    steps.push({ move: node.move, station: node.station, formed: node.before?.formed ?? 0 });
  }
  return { kind: "found", steps: steps.reverse(), seconds: goal.weight - goal.demerits * DEMERIT_SECONDS, demerits: goal.demerits, weight: goal.weight, expanded };
}

function bitCount(set: number): number {
  let count = 0;
  for (let rest = set; rest !== 0; rest &= rest - 1) count += 1;
  return count;
}
