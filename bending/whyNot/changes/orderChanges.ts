import type { PlanChange } from "../../plan/planChange";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { fewestMoved } from "./fewestMoved";

/** For a person's own order: strokes of several bends made one by one, and the fewest strokes moved to another place. */
export function orderChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts } = facts;
  if (!("order" in attempts.request)) return [];
  attempts.doing("Looking for the nearest order that would do");
  const own = attempts.request.order;
  return [...oneByOne(facts, own), ...moved(facts, own)];
}

/** As few joint strokes as will do, made one by one in their place. */
function oneByOne({ attempts }: WhyFacts, own: readonly string[]): readonly PlanChange[] {
  const joint = own.filter((entry) => entry.includes("+"));
  const sets = [...joint.map((entry) => [entry]), ...(joint.length > 1 ? [joint] : [])];
  for (const split of sets) {
    const before = attempts.plans();
    const order = own.flatMap((entry) => (split.includes(entry) ? entry.split("+").map((id) => id.trim()) : [entry]));
    const attempt = attempts.first({ order });
    if (attempt.kind !== "works") continue;
    return [offeredChange(attempts, before, { change: { order }, plan: attempt.plan }, {
      kind: "one-by-one", group: "order", what: { bends: split.flatMap((entry) => entry.split("+")) }, amount: null, with: [], order,
      message: `${split.join(" and ")} made one by one in the same place, ${order.join(", ")}, would do.`,
    })];
  }
  return [];
}

function moved(facts: WhyFacts, own: readonly string[]): readonly PlanChange[] {
  const { attempts } = facts;
  const before = attempts.plans();
  const found = fewestMoved(facts, own);
  if (found === null) return [];
  const { order, strokes, plan, least } = found;
  const count = strokes.length;
  return [offeredChange(attempts, before, { change: { order }, plan, ...(least ? { notEnough: count - 1 } : {}), resolution: 1 }, {
    kind: "move-bends", group: "order", what: { bends: strokes.flatMap((entry) => entry.split("+")) }, amount: { name: "strokes moved", value: count, unit: "bends" }, with: [], order,
    message: `With ${strokes.join(", ")} moved and all else in its order, ${order.join(", ")}, there is a plan${least ? "; no order with fewer moved has one" : ""}.`,
  })];
}
