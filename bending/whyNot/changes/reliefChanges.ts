import { formatLength } from "../../core/formatLength";
import { toDeg } from "../../core/units";
import type { PlanChange } from "../../plan/planChange";
import { leastAmount } from "../leastAmount";
import { bodyWidth } from "../newTool/bodyWidth";
import { relievedPunch } from "../newTool/relievedPunch";
import { newId } from "../newTool/asNew";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";
import { ratingNeeded } from "./ratingNeeded";

/** mm behind the tip's axis, tried in turn. */
const DEPTHS = [0, 8, 16, 24, 32, 48, 64, 96];
/** mm that a punch may be higher than the owned one for it. */
const HIGHER = [0, 50, 100];
const DEPTH_MM = 0.5;
const TOP_MM = 1;
/** mm. Upright body that is left under the punch's seat. Common practice, no source. */
const SEAT_MM = 5;
/** mm. Least height of the relief over the tip that is asked about. */
const LEAST_TOP = 10;

/** A punch cut back in front: the least depth of the relief with it as high as it goes, then the least height with that depth. */
export function reliefChanges(facts: WhyFacts): readonly PlanChange[] {
  const { attempts, kinds, punches } = facts;
  const like = punches.find(({ tipAngle }) => toDeg(tipAngle) >= 80);
  if (like === undefined || !kinds.has("clearance")) return [];
  const { request } = attempts;
  const units = request.document.units;
  attempts.doing("Looking for a relieved punch that would do");
  for (const higher of HIGHER) {
    const before = attempts.plans();
    const [height, width] = [like.height + higher, Math.min(26, bodyWidth(like))];
    const highest = (depth: number) => Math.floor(height - depth - width / 2 - SEAT_MM);
    const changed = (depth: number, top: number) => {
      const punch = depth < 0 ? null : relievedPunch(like, { depth, top, height, width });
      return punch === null ? null : { tools: [...request.tools, punch] };
    };
    const depth = leastAmount({ attempts, from: -DEPTH_MM, asItIs: false, ladder: DEPTHS, resolution: DEPTH_MM, change: (value) => changed(value, highest(value)) });
    if (depth === null) continue;
    const top = leastAmount({ attempts, from: LEAST_TOP, asItIs: false, ladder: [highest(depth.value)], resolution: TOP_MM, change: (value) => changed(depth.value, value) });
    const worked = top ?? depth;
    const upTo = top?.value ?? highest(depth.value);
    const rating = ratingNeeded(facts, worked.plan, worked.change.tools ?? [], newId("punch"));
    const length = (value: number) => formatLength(value, units);
    return [offeredChange(attempts, before, inUnits({ ...depth, change: worked.change, plan: worked.plan }, DEPTH_MM, units), {
      kind: "punch-relief", group: "tool", what: { tools: [like.id] },
      amount: lengthAmount("relief behind the tip's axis", depth.value, units),
      with: [lengthAmount("height of the relief over the tip", upTo, units), lengthAmount("height of the punch", height, units), rating],
      message: `A punch of ${toDeg(like.tipAngle).toFixed(0)}° whose front is cut back by at least ${length(depth.value)} behind the tip's axis, up to ${length(upTo)} over the tip, ` +
        `${length(height)} high and rated for at least ${rating.value} kN/m, would do.`,
    })];
  }
  return [];
}
