import { createCostToGo } from "../order/createCostToGo";
import type { OrderProblem } from "../order/orderProblem";
import { searchOrder, type SearchLimits } from "../order/searchOrder";

export type UnhinderedOrder =
  | {
    readonly kind: "found";
    readonly weight: number;
    readonly steps: readonly { readonly move: number; readonly formed: number }[];
    readonly expanded: number;
    readonly better: Pick<SearchLimits, "toGo">;
    /** The sets of formed bends that an order can come to, ascending; null when there are too many to tell. */
    readonly sets: readonly number[] | null;
  }
  | { readonly kind: "none"; readonly deadEnds: readonly number[]; readonly expanded: number }
  | { readonly kind: "stopped"; readonly bound: number; readonly expanded: number };

/** Up to so many bends the cost to go is worked out for every state: it pays back on each bed that is tried. */
const EVERY_STATE_UP_TO = 12;

/** The best order with the bed left out, and the cost to go that bounds every order with a bed. */
export function unhindered(problem: OrderProblem, limits: SearchLimits): UnhinderedOrder {
  if (problem.bends > EVERY_STATE_UP_TO) {
    const outcome = searchOrder(problem, limits);
    return outcome.kind === "found" ? { ...outcome, better: {}, sets: null } : outcome;
  }
  const costToGo = createCostToGo(problem, limits.shouldStop ?? (() => false));
  if (costToGo === null) return { kind: "stopped", bound: 0, expanded: 0 };
  const weight = costToGo.from(0, null);
  const expanded = costToGo.states();
  if (!Number.isFinite(weight)) return { kind: "none", deadEnds: costToGo.deadEnds(), expanded };
  return { kind: "found", weight, steps: costToGo.moves(), expanded, sets: costToGo.sets(), better: { toGo: (formed, move) => costToGo.from(formed, move) } };
}
