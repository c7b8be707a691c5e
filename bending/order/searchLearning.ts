import { createCostSoFar, type CostSoFar } from "./createCostSoFar";
import type { LeastOption, OrderProblem } from "./orderProblem";
import { searchOrder, type OrderOutcome, type SearchLimits } from "./searchOrder";

/** An order question that learns from its answers: what `least` says grows with them. */
export interface LearningProblem extends OrderProblem {
  readonly least: (move: number, formed: number) => LeastOption | null;
  /** How much was learned so far. */
  readonly learned: () => number;
}

export interface LearnedOutcome {
  readonly outcome: OrderOutcome;
  /** The last bound that was worked out. */
  readonly soFar: CostSoFar | null;
  /** Something was learned since: another bound would be better. */
  readonly stale: boolean;
}

/** A bound is worked out again after so much was learned, and the more the larger its table is: it takes as long as asking that much. */
const LEARNED_AT_LEAST = 12;
const ENTRIES_AN_ANSWER = 8000;
/** A state takes as long to look at as so many entries of a table. */
const ENTRIES_A_STATE = 60;

/**
 * The best order of a problem that learns. Search and bound go by turns: the search asks where the bound leads, what the
 * answers teach makes the bound better, and the search begins again with it; what was asked once is not asked again.
 */
export function searchLearning(problem: LearningProblem, limits: SearchLimits): LearnedOutcome {
  const stop = limits.shouldStop ?? (() => false);
  const entries = 2 ** problem.bends * problem.moves.length;
  const patience = LEARNED_AT_LEAST + entries / ENTRIES_AN_ANSWER;
  let soFar = limits.soFar ?? createCostSoFar(problem, stop);
  let expanded = 0;
  let bound = 0;
  for (;;) {
    const known = problem.learned();
    let states = 0;
    const worthIt = () => soFar !== null && (problem.learned() > known + patience || (problem.learned() > known && states > LEARNED_AT_LEAST + entries / ENTRIES_A_STATE));
    const outcome = searchOrder(problem, { ...limits, soFar, onExpand: (count) => { states = count; limits.onExpand?.(expanded + count); }, shouldStop: () => worthIt() || stop() });
    expanded += outcome.expanded;
    if (outcome.kind !== "stopped") return { outcome: { ...outcome, expanded }, soFar, stale: problem.learned() > known };
    bound = Math.max(bound, outcome.bound);
    if (stop() || outcome.full) return { outcome: { ...outcome, bound, expanded }, soFar, stale: problem.learned() > known };
    soFar = createCostSoFar(problem, stop);
  }
}
