import type { PlanDocument } from "@/bending/plan/planDocument";

/** What a plan leaves unmet: fingers that it goes without, and wishes for a die that its cautions name. Fewer always go before less time. */
export const planDemerits = (plan: PlanDocument): number => plan.steps.reduce((sum, { gauge }) => sum + Math.max(0, 2 - gauge.fingers.length), 0)
  + plan.cautions.filter(({ kind, tools }) => (kind === "radius" || kind === "tool-choice") && tools.length === 1).length;

/** Fewest unmet wishes first, then the least time; no plan is worst of all. Negative when `a` is better by more than rounding. */
export function comparePlans(a: PlanDocument, b: PlanDocument): number {
  const made = (plan: PlanDocument) => (plan.status === "optimal" ? 0 : 1);
  if (made(a) !== made(b) || made(a) === 1) return made(a) - made(b);
  const seconds = a.cost - b.cost;
  return planDemerits(a) - planDemerits(b) || (Math.abs(seconds) < 1e-4 ? 0 : seconds);
}
