import type { CostSoFar } from "./createCostSoFar";
import { createNodes, SAME_SECONDS, UNASKED, type SearchNode } from "./createNodes";
import { handlingTable } from "./handlingTable";
import { mayShare } from "./mayShare";
import { ANY_GAUGE, DEMERIT_SECONDS, MAX_BENDS, type OrderProblem, type OrderStep } from "./orderProblem";
import { remainingBound } from "./remainingBound";

export interface SearchLimits {
  /** Only plans cheaper than this (demerits weighed in) are looked for. */
  readonly under?: number;
  readonly shouldStop?: () => boolean;
  /** What the steps before a state cost at the least, of this problem or of one that bounds it; counted from the problem's facts when absent. */
  readonly soFar?: CostSoFar | null;
  readonly onExpand?: (expanded: number) => void;
  /** So many states at the most. */
  readonly most?: number;
  /** Over 1: what is left weighs so many times as much, so that some order comes sooner; the answer is not the best then, and a bound is none. */
  readonly haste?: number;
}

export type OrderOutcome =
  | { readonly kind: "found"; readonly steps: readonly OrderStep[]; readonly seconds: number; readonly demerits: number; readonly weight: number; readonly expanded: number }
  | { readonly kind: "none"; readonly expanded: number; /** What was left aside for being over the limit weighs so much at the least; Infinity when nothing was. */ readonly over: number }
  | { readonly kind: "stopped"; /** No plan weighs less. */ readonly bound: number; readonly expanded: number; /** It stopped because it would take too much memory. */ readonly full?: true };

/** Steps that are kept at once: about 200 MB. */
const MOST_NODES = 2 ** 22;

/**
 * The best order, looked for from the finished part back to the flat one, as the last bends are the hardest to make.
 * Best first over (formed set, pose, gauge, station): what the steps before a state cost depends on nothing else of what
 * follows, so each state is kept once with its cheapest way. A step is queued at what is known of it without asking; `option`
 * is asked when it comes first, and it is queued again when it costs more. The first whole order taken is optimal.
 */
export function searchOrder(problem: OrderProblem, limits: SearchLimits = {}): OrderOutcome {
  if (problem.bends > MAX_BENDS) throw new Error(`invariant: at most ${MAX_BENDS} bends`);
  const { moves, stations, times } = problem;
  const all = 2 ** problem.bends - 1;
  const { seconds: hand, pose, poses } = handlingTable(problem);
  const plain = remainingBound(problem);
  const { soFar = null, under = Infinity, most = Infinity, haste = 1 } = limits;
  const nodes = createNodes();
  const best = new Map<number, number>();
  let expanded = 0;
  let over = Infinity;

  const strokesOf = (move: number) => (moves[move]?.strokes ?? 1) * times.stroke;
  /** What the steps up to and with an unasked one cost at the least. */
  const bound = (formed: number, move: number): number => soFar?.with(formed, move) ?? plainUpTo(formed, move) + strokesOf(move);
  const plainUpTo = (formed: number, move: number): number => times.gaugeMove + (formed === 0 ? 0 : plain(formed, moves[move]?.pose ?? null));

  const queue = (after: number, next: SearchNode | null): void => {
    const open = next === null ? all : next.formed;
    for (let move = moves.length - 1; move >= 0; move -= 1) {
      const mask = moves[move]?.mask ?? 0;
      if ((mask & open) !== mask) continue;
      const formed = open & ~mask;
      const known = problem.least === undefined ? { gauges: null } : problem.least(move, formed);
      if (known === null) continue;
      const upTo = bound(formed, move);
      if (upTo === Infinity) continue;
      const gauge = next === null || mayShare(known.gauges, next.gauge === ANY_GAUGE ? null : [next.gauge]) ? 0 : times.gaugeMove;
      for (let station = 0; station < stations; station += 1) {
        const weight = next === null ? 0 : next.weight + (hand[move * moves.length + next.move] ?? 0) + (station === next.station ? 0 : problem.walk(station, next.station));
        const total = weight + gauge + haste * upTo;
        if (total >= under - SAME_SECONDS) over = Math.min(over, total);
        else nodes.add({ formed, move, station, gauge: UNASKED, weight, demerits: next?.demerits ?? 0, depth: (next?.depth ?? 0) + 1, after }, total);
      }
    }
  };

  /** Asks the problem about a step; its total now, or null when it cannot be made. */
  const ask = (at: number, node: SearchNode): number | null => {
    const option = problem.option(node.move, node.formed, node.station);
    if (option === null) return null;
    const next = node.after < 0 ? null : nodes.get(node.after);
    const moved = next === null || next.gauge === option.gauge || next.gauge === ANY_GAUGE || option.gauge === ANY_GAUGE ? 0 : times.gaugeMove;
    const weight = node.weight + moved + strokesOf(node.move) + option.demerit * DEMERIT_SECONDS;
    nodes.set(at, weight, option.gauge, node.demerits + option.demerit);
    const upTo = soFar?.upTo(node.formed, node.move, option.gauge) ?? plainUpTo(node.formed, node.move);
    return Math.max(nodes.total(at), weight + haste * upTo);
  };

  const keyOf = ({ formed, move, station, gauge }: SearchNode) => (((gauge + 1) * stations + station) * poses + (pose[move] ?? 0)) * (all + 1) + formed;

  queue(-1, null);
  for (let at = nodes.take(); at >= 0; at = nodes.take()) {
    const total = nodes.total(at);
    let node = nodes.get(at);
    if (nodes.count() > MOST_NODES) return { kind: "stopped", bound: total, expanded, full: true };
    if (limits.shouldStop?.() || expanded >= most) return { kind: "stopped", bound: total, expanded };
    if (node.gauge === UNASKED) {
      const asked = ask(at, node);
      if (asked === null) continue;
      if (asked >= under - SAME_SECONDS) { over = Math.min(over, asked); continue; }
      node = nodes.get(at);
      const known = best.get(keyOf(node));
      if (known !== undefined && known <= node.weight + SAME_SECONDS) continue;
      best.set(keyOf(node), node.weight);
      if (asked > total + SAME_SECONDS) { nodes.again(at, asked); continue; }
    }
    if ((best.get(keyOf(node)) ?? Infinity) < node.weight - SAME_SECONDS) continue;
    if (node.formed === 0) return found(at);
    expanded += 1;
    limits.onExpand?.(expanded);
    queue(at, node);
  }
  return { kind: "none", expanded, over };

  function found(first: number): OrderOutcome {
    const steps: OrderStep[] = [];
    for (let at = first; at >= 0; at = nodes.get(at).after) {
      const { move, station, formed } = nodes.get(at);
      steps.push({ move, station, formed });
    }
    const { weight, demerits } = nodes.get(first);
    const whole = weight + times.gaugeMove;
    return { kind: "found", steps, seconds: whole - demerits * DEMERIT_SECONDS, demerits, weight: whole, expanded };
  }
}
