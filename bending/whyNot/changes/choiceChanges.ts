import type { BendWish } from "../../plan/bendWish";
import type { PlanChange } from "../../plan/planChange";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";

/** For a person who chose fronts or tools for bends: one bend left free again, else all of them. */
export function choiceChanges({ attempts }: WhyFacts): readonly PlanChange[] {
  const wishes = attempts.request.wishes ?? [];
  if (wishes.length === 0) return [];
  attempts.doing("Looking which choice stands in the way");
  const free = (chosen: readonly BendWish[]): readonly PlanChange[] => {
    const before = attempts.plans();
    const change = { wishes: wishes.filter((wish) => !chosen.includes(wish)) };
    const attempt = attempts.first(change);
    if (attempt.kind !== "works") return [];
    const bends = chosen.map(({ bend }) => bend);
    return [offeredChange(attempts, before, { change, plan: attempt.plan }, {
      kind: "free-choice", group: "order", what: { bends }, amount: null, with: [],
      message: `With ${chosen.map(inWords).join(" and ")} left to the planner there is a plan.`,
    })];
  };
  const single = wishes.flatMap((wish) => free([wish]));
  return single.length > 0 || wishes.length === 1 ? single : free(wishes);
}

function inWords({ bend, front, punch, die }: BendWish): string {
  const what = [front === undefined ? "" : `${front} in front`, punch ?? "", die ?? ""].filter((word) => word !== "").join(", ");
  return `the choice for ${bend} (${what})`;
}
