import { formatLength } from "../../core/formatLength";
import type { PlanChange } from "../../plan/planChange";
import type { Die, Punch } from "../../tooling/tool";
import { leastAmount } from "../leastAmount";
import { newId } from "../newTool/asNew";
import { bodyWidth } from "../newTool/bodyWidth";
import { isStraight } from "../newTool/isStraight";
import { otherDie } from "../newTool/otherDie";
import { straightPunch } from "../newTool/straightPunch";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";
import { ratingNeeded } from "./ratingNeeded";

/** Parts of the owned tool's width, tried in turn. */
const PARTS = [0.85, 0.7, 0.55, 0.4, 0.25];
const WIDTH_MM = 0.5;
/** mm. A thinner straight punch is not asked about. Common practice, no source. */
const THINNEST_PUNCH = 10;
/** mm of top plane beside each shoulder that a die keeps. Common practice, no source. */
const BESIDE_V = 3;

/** A straight punch or a die with a narrower body: the widest that does. */
export function widthChanges(facts: WhyFacts): readonly PlanChange[] {
  const { kinds, punches, dies, attempts } = facts;
  if (!kinds.has("clearance")) return [];
  attempts.doing("Looking for a narrower punch or die that would do");
  return [...punches.filter(isStraight).slice(0, 1), ...dies.slice(0, 1)].flatMap((like) => narrower(facts, like) ?? []);
}

function narrower(facts: WhyFacts, like: Punch | Die): PlanChange | null {
  const { attempts } = facts;
  const { request } = attempts;
  const before = attempts.plans();
  const units = request.document.units;
  const from = bodyWidth(like);
  const least = like.kind === "punch" ? THINNEST_PUNCH : like.vOpening + 2 * BESIDE_V;
  const grid = (value: number) => Math.floor(value / WIDTH_MM) * WIDTH_MM;
  const found = leastAmount({
    attempts, from, asItIs: true, resolution: WIDTH_MM,
    ladder: PARTS.map((part) => grid(from * part)).filter((width) => width >= least),
    change: (width) => ({ tools: [...request.tools, like.kind === "punch" ? straightPunch(like, width) : otherDie(like, { width })] }),
  });
  if (found === null) return null;
  const rating = ratingNeeded(facts, found.plan, found.change.tools ?? [], newId(like.kind));
  return offeredChange(attempts, before, inUnits(found, WIDTH_MM, units), {
    kind: like.kind === "punch" ? "punch-width" : "die-width", group: "tool", what: { tools: [like.id] },
    amount: lengthAmount("width of the body", found.value, units, from), with: [rating],
    message: `A ${like.kind === "punch" ? "straight punch" : "die"} like ${like.id} with a body at most ${formatLength(found.value, units)} wide (it has ${formatLength(from, units)}), rated for at least ${rating.value} kN/m, would do.`,
  });
}
