import { formatLength } from "../../core/formatLength";
import type { PlanChange } from "../../plan/planChange";
import type { Die, Punch } from "../../tooling/tool";
import { leastAmount } from "../leastAmount";
import { newId } from "../newTool/asNew";
import { tallerTool } from "../newTool/tallerTool";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";
import { ratingNeeded } from "./ratingNeeded";

/** mm more than the owned tool has, then less. */
const TALLER = [10, 20, 40, 80, 160];
const SHORTER = [-10, -20, -40, -60];
const HEIGHT_MM = 1;
/** mm. Lower tools are not asked about. */
const LEAST_HEIGHT = 40;

/** Owned punches and dies of another height: the least that is taller, or else shorter. */
export function heightChanges(facts: WhyFacts): readonly PlanChange[] {
  const { kinds, punches, dies, attempts } = facts;
  if (!kinds.has("clearance") && !kinds.has("daylight")) return [];
  attempts.doing("Looking for a punch or die of another height that would do");
  const shapes = [...punches.slice(0, 2), ...dies.slice(0, 1)];
  return shapes.flatMap((like) => ofHeight(facts, like, TALLER) ?? ofHeight(facts, like, SHORTER) ?? []);
}

function ofHeight(facts: WhyFacts, like: Punch | Die, ladder: readonly number[]): PlanChange | null {
  const { attempts } = facts;
  const { request } = attempts;
  const before = attempts.plans();
  const units = request.document.units;
  const found = leastAmount({
    attempts, from: like.height, asItIs: true, resolution: HEIGHT_MM,
    ladder: ladder.map((more) => Math.round(like.height + more)).filter((height) => height >= LEAST_HEIGHT),
    change: (height) => ({ tools: [...request.tools, tallerTool(like, height)] }),
  });
  if (found === null) return null;
  const rating = ratingNeeded(facts, found.plan, found.change.tools ?? [], newId(like.kind));
  const way = found.value > like.height ? "at least" : "at most";
  return offeredChange(attempts, before, inUnits(found, HEIGHT_MM, units), {
    kind: like.kind === "punch" ? "punch-height" : "die-height", group: "tool", what: { tools: [like.id] },
    amount: lengthAmount("height", found.value, units, like.height), with: [rating],
    message: `A ${like.kind} like ${like.id} that is ${way} ${formatLength(found.value, units)} high (it has ${formatLength(like.height, units)}), rated for at least ${rating.value} kN/m, would do.`,
  });
}
