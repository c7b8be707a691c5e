import { checkOrder } from "../plan/checkOrder";
import type { PlanDocument } from "../plan/planDocument";
import { planPart } from "../plan/planPart";
import type { CheckRequest, PlanRequest } from "../plan/planRequest";
import type { WhyLimits } from "./whyLimits";

/** What is changed of the request; a change of order for a person's own. */
export type Change = Partial<Pick<CheckRequest, "document" | "tools" | "machine" | "order" | "wishes">>;

/** Whether there is a plan with a change: `fails` is proven, `unknown` ended too early or found no bed. */
export type Attempt = { readonly kind: "works"; readonly plan: PlanDocument } | { readonly kind: "fails" | "unknown" };

/** The planner, asked again and again with something changed, within one budget. */
export interface Attempts {
  readonly request: PlanRequest | CheckRequest;
  /** Is it proven that the request as it is gives no plan? */
  readonly impossible: boolean;
  /** Is there any plan with the change? */
  readonly first: (change: Change) => Attempt;
  /** The best plan with a change that works, or the one that is known when the budget does not reach. */
  readonly best: (change: Change, known: PlanDocument) => PlanDocument;
  readonly plans: () => number;
  /** True once nothing more may be tried. */
  readonly ended: () => boolean;
  readonly doing: (message: string) => void;
}

/** Plans that may be made unless the limits say otherwise. */
const MOST_PLANS = 400;
/** How often one plan may ask whether to stop: a deterministic limit, some seconds on a usual machine. */
const ASKS_A_PLAN = 60_000;

export function createAttempts(request: PlanRequest | CheckRequest, answer: PlanDocument, limits: WhyLimits): Attempts {
  const most = limits.plans ?? MOST_PLANS;
  let [plans, stopped] = [0, false];
  let message = "Looking what stands in the way";
  const ended = () => {
    stopped ||= plans >= most || (limits.shouldStop?.() ?? false);
    return stopped;
  };
  const made = (change: Change, firstPlan: boolean): PlanDocument => {
    let asked = 0;
    plans += 1;
    limits.onProgress?.({ expanded: plans, fraction: null, message });
    const changed = {
      ...request, ...change, firstPlan, alternatives: 0, onProgress: () => undefined,
      shouldStop: () => {
        asked += 1;
        return asked > ASKS_A_PLAN || (limits.shouldStop?.() ?? false);
      },
    };
    return "order" in changed && changed.order !== undefined ? checkOrder({ ...changed, order: changed.order }) : planPart(changed);
  };
  return {
    request,
    impossible: answer.status === "infeasible",
    first: (change) => {
      if (ended()) return { kind: "unknown" };
      const plan = made(change, true);
      return isPlan(plan) ? { kind: "works", plan } : { kind: plan.status === "infeasible" ? "fails" : "unknown" };
    },
    best: (change, known) => {
      const plan = ended() ? known : made(change, false);
      return isPlan(plan) && plan.cost <= known.cost ? plan : known;
    },
    plans: () => plans,
    ended,
    doing: (what) => { message = what; },
  };
}

const isPlan = ({ status }: PlanDocument) => status === "optimal" || status === "feasible";
