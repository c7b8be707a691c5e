import { createCostSoFar, type CostSoFar } from "../order/createCostSoFar";
import { searchOrder, type OrderOutcome, type SearchLimits } from "../order/searchOrder";
import type { RelaxedProblem } from "./relaxedProblem";

export interface UnhinderedOrder {
  readonly outcome: OrderOutcome;
  /** What the steps before a state cost at the least: it bounds every order with a bed too. */
  readonly soFar: CostSoFar | null;
}

/** A bound is worked out again after so much was learned, and the more the larger its table is: it takes as long as asking that much. */
const LEARNED_AT_LEAST = 12;
const ENTRIES_AN_ANSWER = 8000;

/**
 * The best order with the bed left out. Search and bound go by turns: the search asks where the bound leads, what the
 * answers teach makes the bound better, and the search begins again with it; asked once, nothing is asked again.
 */
export function unhindered(problem: RelaxedProblem, limits: SearchLimits): UnhinderedOrder {
  const stop = limits.shouldStop ?? (() => false);
  const patience = LEARNED_AT_LEAST + (2 ** problem.bends * problem.moves.length) / ENTRIES_AN_ANSWER;
  let expanded = 0;
  let bound = 0;
  for (;;) {
    const soFar = createCostSoFar(problem, stop);
    const known = problem.learned();
    const worthIt = () => soFar !== null && problem.learned() > known + patience;
    const outcome = searchOrder(problem, { ...limits, soFar, shouldStop: () => worthIt() || stop() });
    expanded += outcome.expanded;
    if (outcome.kind !== "stopped") return { outcome: { ...outcome, expanded }, soFar };
    bound = Math.max(bound, outcome.bound);
    if (stop()) return { outcome: { ...outcome, bound, expanded }, soFar };
  }
}
