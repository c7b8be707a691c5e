import type { PlanChange } from "../plan/planChange";
import type { PlanDocument } from "../plan/planDocument";
import type { Attempts, Change } from "./createAttempts";

/** A change that gave a plan, with the best plan that the budget finds for it. `before`: plans made when the search for it began. */
export function offeredChange(
  attempts: Attempts, before: number, worked: { readonly change: Change; readonly plan: PlanDocument; readonly notEnough?: number; readonly resolution?: number },
  said: Omit<PlanChange, "plan" | "found">,
): PlanChange {
  const plan = attempts.best(worked.change, worked.plan);
  return {
    ...said,
    plan: { status: plan.status === "optimal" ? "optimal" : "feasible", cost: plan.cost, order: plan.order },
    found: {
      plans: attempts.plans() - before,
      ...(worked.notEnough === undefined ? {} : { notEnough: worked.notEnough }),
      ...(worked.resolution === undefined ? {} : { resolution: worked.resolution }),
    },
  };
}
