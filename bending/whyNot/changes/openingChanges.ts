import { formatLength } from "../../core/formatLength";
import { FORCE_V_RANGE } from "../../handbook/airBendForce";
import type { PlanChange } from "../../plan/planChange";
import { leastAmount } from "../leastAmount";
import { newId } from "../newTool/asNew";
import { bodyWidth } from "../newTool/bodyWidth";
import { otherDie } from "../newTool/otherDie";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";
import { ratingNeeded } from "./ratingNeeded";

/** The V as a multiple of the owned one's, tried in turn. */
const NARROWER = [0.9, 0.8, 0.65, 0.5, 0.35, 0.25];
const WIDER = [1.1, 1.25, 1.5, 2, 3, 4];
const V_MM = 0.5;
/** mm of die beside the V. Common practice, no source. */
const BESIDE_V = 6;

/** A die of another V: the widest of the narrower ones where the level sheet is short, the narrowest of the wider ones where the force is high. */
export function openingChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds, dies, situations: { part } } = facts;
  if (part === null) return [];
  const { request } = attempts;
  const units = request.document.units;
  const [least, most] = [FORCE_V_RANGE[0] * part.thickness, FORCE_V_RANGE[1] * part.thickness];
  const byV = [...dies].sort((a, b) => a.vOpening - b.vOpening);
  const ways = [
    ...(kinds.has("minimum-flange") || kinds.has("no-die") ? [{ ladder: NARROWER, says: "at most", like: byV[0] }] : []),
    ...(["force", "tool-force", "no-die"] as const).some((kind) => kinds.has(kind)) ? [{ ladder: WIDER, says: "at least", like: byV[byV.length - 1] }] : [],
  ];
  return ways.flatMap(({ ladder, says, like }) => {
    if (like === undefined) return [];
    attempts.doing("Looking for a die of another V that would do");
    const before = attempts.plans();
    const found = leastAmount({
      attempts, from: like.vOpening, asItIs: true, resolution: V_MM,
      ladder: ladder.map((by) => Math.round((like.vOpening * by) / V_MM) * V_MM).filter((v) => v >= least && v <= most && v !== like.vOpening),
      change: (vOpening) => ({ tools: [...request.tools, otherDie(like, { vOpening, width: Math.max(bodyWidth(like), vOpening + 2 * BESIDE_V) })] }),
    });
    if (found === null) return [];
    const rating = ratingNeeded(facts, found.plan, found.change.tools ?? [], newId("die"));
    return [offeredChange(attempts, before, inUnits(found, V_MM, units), {
      kind: "die-opening", group: "tool", what: { tools: [like.id] },
      amount: lengthAmount("V opening", found.value, units, like.vOpening), with: [rating],
      message: `A die with a V of ${says} ${formatLength(found.value, units)}, rated for at least ${rating.value} kN/m, would do.`,
    })];
  });
}
