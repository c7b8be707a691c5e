import type { PlanChange } from "../../plan/planChange";
import type { Die, Punch } from "../../tooling/tool";
import { leastAmount } from "../leastAmount";
import { strongerTool } from "../newTool/strongerTool";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";

/** The rating as a multiple of the owned tool's, tried in turn. */
const TIMES = [1.1, 1.25, 1.5, 2, 3];

/** Tools rated higher, where the force is over the rating of the owned ones: one of the two, else both. */
export function ratingChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds, punches: [punch], dies: [die] } = facts;
  if (!kinds.has("tool-force") || punch === undefined || die === undefined) return [];
  attempts.doing("Looking for stronger tools that would do");
  for (const likes of [[punch], [die], [punch, die]]) {
    const change = rated(facts, likes);
    if (change) return [change];
  }
  return [];
}

function rated({ attempts }: WhyFacts, likes: readonly (Punch | Die)[]): PlanChange | null {
  const before = attempts.plans();
  const from = Math.floor(Math.min(...likes.map(({ maxForcePerMetre }) => maxForcePerMetre)));
  const found = leastAmount({
    attempts, from, asItIs: true, ladder: TIMES.map((by) => Math.ceil(from * by)), resolution: 1,
    change: (rating) => ({ tools: [...attempts.request.tools, ...likes.map((like) => strongerTool(like, rating))] }),
  });
  const names = likes.map(({ id }) => id).join(" and ");
  return found && offeredChange(attempts, before, { ...found, resolution: 1 }, {
    kind: "tool-rating", group: "tool", what: { tools: likes.map(({ id }) => id) },
    amount: { name: "rating", value: found.value, unit: "kN/m", from }, with: [],
    message: `Tools like ${names} that are rated for at least ${found.value} kN/m would do; ${names} must not be loaded beyond ${likes.length > 1 ? "their" : "its"} rating.`,
  });
}
