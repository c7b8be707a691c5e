import { createCostSoFar, type CostSoFar } from "../order/createCostSoFar";
import type { OrderProblem, OrderStep } from "../order/orderProblem";
import { searchOrder, type OrderOutcome, type SearchLimits } from "../order/searchOrder";

export interface UnhinderedOrder {
  readonly outcome: OrderOutcome;
  /** Some order, when there is one; the best when `outcome` found it. */
  readonly steps: readonly OrderStep[] | null;
  /** What the steps before a state cost at the least: it bounds every order with a bed too. */
  readonly soFar: CostSoFar | null;
}

/** States after which some order is looked for before the search for the best goes on. */
const STATES_BEFORE_SOME_ORDER = 300;
/** How much more the rest of an order weighs while just some order is looked for. */
const HASTE = 3;

/** The best order with the bed left out; `onSome` is told of an order that may not be the best, when the best takes long. */
export function unhindered(problem: OrderProblem, limits: SearchLimits, onSome: (steps: readonly OrderStep[], soFar: CostSoFar | null) => boolean): UnhinderedOrder {
  const soFar = createCostSoFar(problem, limits.shouldStop ?? (() => false));
  const first = searchOrder(problem, { ...limits, soFar, most: STATES_BEFORE_SOME_ORDER });
  if (first.kind !== "stopped") return { outcome: first, steps: first.kind === "found" ? first.steps : null, soFar };
  const some = searchOrder(problem, { ...limits, soFar, haste: HASTE });
  const steps = some.kind === "found" ? some.steps : null;
  if (some.kind === "none") return { outcome: some, steps, soFar };
  if (steps && !onSome(steps, soFar)) return { outcome: first, steps, soFar };
  const outcome = searchOrder(problem, { ...limits, soFar });
  return { outcome, steps: outcome.kind === "found" ? outcome.steps : steps, soFar };
}
