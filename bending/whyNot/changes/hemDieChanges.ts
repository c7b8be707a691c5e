import { deg, mmPer, toDeg, toRad } from "../../core/units";
import { formatLength } from "../../core/formatLength";
import { vOpeningRule } from "../../handbook/vOpeningRule";
import type { PlanChange } from "../../plan/planChange";
import type { PlanDocument } from "../../plan/planDocument";
import { leastAmount } from "../leastAmount";
import { newId } from "../newTool/asNew";
import { bodyWidth } from "../newTool/bodyWidth";
import { HEM_ANGLE_DEG, hemDie } from "../newTool/hemDie";
import { isStraight } from "../newTool/isStraight";
import { straightPunch } from "../newTool/straightPunch";
import { offeredChange } from "../offeredChange";
import type { WhyFacts } from "../whyFacts";
import { inUnits } from "./inUnits";
import { lengthAmount } from "./lengthAmount";

/** mm of slot, tried in turn. */
const OPENINGS = [10, 16, 24, 40, 60];
const OPENING_MM = 1;
/** mm. Depth of the slot: common practice, no source. */
const SLOT_DEPTH = 31;
/** kN/m. Higher than any closing takes, to ask for the shape first; the rating that is needed is read off the plan. */
const ANY_RATING = 20_000;

/** Where hems cannot be closed for want of a die: a two-stage hem die with the least slot that does, and a sharp punch where there is none. */
export function hemDieChanges({ attempts, kinds, punches, dies: [die], situations: { part } }: WhyFacts): readonly PlanChange[] {
  const punch = punches.find(isStraight);
  if (!kinds.has("hem") || punch === undefined || die === undefined || part === null) return [];
  attempts.doing("Looking for a hem die that would do");
  const { request } = attempts;
  const units = request.document.units;
  const before = attempts.plans();
  const vOpening = Math.round(vOpeningRule(part.thickness));
  const sharp = request.tools.some((tool) => tool.kind === "punch" && tool.tang === request.machine.punchTang && tool.pieces.length > 0 && toDeg(tool.tipAngle) <= HEM_ANGLE_DEG + 1e-6);
  const tools = (opening: number, rating: number) => [
    ...request.tools, hemDie(die, { vOpening, opening, depth: SLOT_DEPTH, rating }), ...(sharp ? [] : [straightPunch(punch, bodyWidth(punch), toRad(deg(HEM_ANGLE_DEG)))]),
  ];
  const found = leastAmount({ attempts, from: 0, asItIs: true, ladder: OPENINGS, resolution: OPENING_MM, change: (opening) => (opening <= 0 ? null : { tools: tools(opening, ANY_RATING) }) });
  if (found === null) return [];
  const rating = loadOf(found.plan, mmPer(units));
  const change = { tools: tools(found.value, rating) };
  const rated = attempts.first(change);
  if (rated.kind !== "works") return [];
  const length = (value: number) => formatLength(value, units);
  return [offeredChange(attempts, before, inUnits({ ...found, change, plan: rated.plan }, OPENING_MM, units), {
    kind: "hem-die", group: "tool", what: { tools: [] },
    amount: lengthAmount("opening of the slot", found.value, units),
    with: [lengthAmount("V opening", vOpening, units), lengthAmount("depth of the slot", SLOT_DEPTH, units), { name: "rating", value: rating, unit: "kN/m" }],
    message: `A two-stage hem die with a V of ${length(vOpening)}, whose slot opens at least ${length(found.value)} and is ${length(SLOT_DEPTH)} deep, rated for at least ${rating} kN/m` +
      `${sharp ? "" : `, and a punch of ${HEM_ANGLE_DEG}°`}, would do.`,
  })];
}

/** kN/m, rounded up: what the new die bears in the plan. */
function loadOf(plan: PlanDocument, mmOfUnit: number): number {
  const loads = plan.steps.filter(({ die }) => die === newId("die")).map(({ forceKN, bendZ: [from, to] }) => (forceKN * 1000) / ((to - from) * mmOfUnit));
  return Math.ceil(Math.max(0, ...loads) - 1e-6);
}
