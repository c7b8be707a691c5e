import { mmPer, toDeg, type LengthUnit } from "../core/units";
import { advisedFlange, minimumFlange } from "../handbook/minimumFlange";
import { minimumRadius } from "../handbook/minimumRadius";
import { formatLength } from "../core/formatLength";
import type { Bend } from "../part/partModel";
import { flatPattern } from "../part/flatPattern";
import type { Layout } from "../setup/layout";
import type { OrderStep } from "../order/orderProblem";
import { readHitId } from "../strokes/hitId";
import { formatBends } from "./formatBends";
import type { PlanReason, PlanStep } from "./planDocument";
import type { Situation } from "./situation";
import { sheetReach } from "./sheetReach";

/** kg. One person's lift under the best conditions: NIOSH load constant, 51 lb. */
const LIFT_LIMIT_KG = 23;
/** Part of a rating above which the step says so. Common practice, no source. */
const NEAR_RATING = 0.8;
/** mm. Sheet in front of the die that whips up far enough to strike. Common practice, no source. */
const WHIP_UP_MM = 400;
/** Openings within this part of each other are one, as in the shop's table. */
const SAME_OPENING = 0.01;

/** What a person should know before making this plan; none of it forbids it. */
export function cautionsOf(situation: Situation, layout: Layout, orderSteps: readonly OrderStep[], steps: readonly PlanStep[]): readonly PlanReason[] {
  const { part } = situation;
  const cautions: PlanReason[] = [];
  const say = (kind: PlanReason["kind"], bends: readonly string[], tools: readonly string[], message: string) =>
    cautions.push({ kind, bends, faces: [], tools, message });
  const { massKg } = flatPattern(part);
  if (massKg > LIFT_LIMIT_KG) say("lift", [], [], `the blank weighs ${massKg.toFixed(1)} kg; above ${LIFT_LIMIT_KG} kg (NIOSH load constant) plan for two people or a support`);
  radiusCautions(situation, say);
  stepCautionsOfRows(situation, say);
  orderSteps.forEach((orderStep, index) => {
    const step = steps[index];
    if (step) stepCautions(situation, layout, orderStep, step, say);
  });
  return cautions;
}

type Say = (kind: PlanReason["kind"], bends: readonly string[], tools: readonly string[], message: string) => void;

/** Bends tighter than the material bears, those that lack the same together. */
function radiusCautions({ drawn: part, units }: Situation, say: Say): void {
  const tight = new Map<string, string[]>();
  for (const bend of part.bends) {
    const least = minimumRadius(part.material, part.thickness, bend.angle);
    if (!least || bend.insideRadius >= least.radius - 1e-6 || bend.hem) continue;
    const lack = `${formatLength(bend.insideRadius, units)} inside; ${least.source} gives ${formatLength(least.radius, units)} at least for ${part.material.id}`;
    tight.set(lack, [...(tight.get(lack) ?? []), bend.id]);
  }
  for (const [lack, bends] of tight) say("radius", bends, [], `${bends.length > 1 ? "bends" : "bend"} ${bends.join(", ")} ${bends.length > 1 ? "have" : "has"} ${lack}`);
}

/** Large radii that are made in steps. */
function stepCautionsOfRows({ drawn, splits, units }: Situation, say: Say): void {
  for (const { bend: id, hits } of splits) {
    const bend = drawn.bends.find((one) => one.id === id);
    if (bend) say("radius", [id], [], `bend ${id}: ${hits} strokes of ${(toDeg(bend.angle) / hits).toFixed(1)}°, ${formatLength(bend.allowance / hits, units)} apart, make the inside radius of ${formatLength(bend.insideRadius, units)}; try them on a strip first`);
  }
}

function stepCautions(situation: Situation, layout: Layout, orderStep: OrderStep, step: PlanStep, say: Say): void {
  const { part, machine, moves, pairs, fits, units } = situation;
  const move = moves[orderStep.move];
  const pair = pairs[layout.stations[orderStep.station]?.pair ?? -1];
  const bend = part.bends[move?.bends[0] ?? -1];
  const fit = fits[move?.bends[0] ?? -1]?.[pair?.index ?? -1];
  if (!move || !pair || !bend || !fit?.ok) return;
  const name = formatBends(step.bends);
  for (const index of move.bends) openingCaution(part.bends[index], pair.die.vOpening, units, say);
  for (const wish of fit.wishes) say(wish.kind, step.bends, wish.tools, wish.message);
  if (step.gauge.fingers.length === 0) say("gauge", step.bends, [], `${name}: nothing behind the die is straight enough for the back gauge; mark the bend line or use a stop`);
  if (step.gauge.fingers.length === 1) say("gauge", step.bends, [], `${name}: only one gauge finger can touch; hold the sheet square by hand or use a side stop`);
  if (step.forceKN > NEAR_RATING * machine.maxForce) say("force", step.bends, [], `${name}: ${step.forceKN.toFixed(0)} kN of ${machine.maxForce.toFixed(0)} kN that ${machine.name} has`);
  if (step.offCentre && step.forceKN > NEAR_RATING * step.offCentre.limitKN && step.offCentre.limitKN < machine.maxForce) {
    say("force", step.bends, [], `${name}: ${step.forceKN.toFixed(0)} kN of the ${step.offCentre.limitKN.toFixed(0)} kN that ${machine.name} bears ${formatLength(Math.round(Math.abs(step.offCentre.z) * mmPer(units)), units)} from the middle of its bed`);
  }
  const rating = Math.min(pair.punch.maxForcePerMetre, pair.die.maxForcePerMetre);
  if (fit.force > NEAR_RATING * rating) say("tool-force", step.bends, [pair.punch.id, pair.die.id], `${name}: ${fit.force.toFixed(0)} kN/m of the ${rating.toFixed(0)} kN/m that the tools bear`);
  if (bend.hem !== null) say("hem", step.bends, [pair.die.id], `${name}: flattening pushes sideways on punch and die; see that both are clamped, and keep hands off the slot`);
  const reach = sheetReach(part, { bends: move.bends, front: move.front, formed: orderStep.formed });
  if (reach.front > WHIP_UP_MM) say("whip-up", step.bends, [], `${name}: ${formatLength(Math.round(reach.front), units)} of sheet swings up ${(toDeg(bend.angle) / 2).toFixed(0)}° in front; stand clear, support it from behind the swing`);
  const setback = (bend.insideRadius + part.thickness) * Math.tan(bend.angle / 2) - bend.allowance / 2;
  const flange = Math.min(reach.front, reach.back) + setback;
  const advised = Math.max(advisedFlange(pair.die.vOpening), minimumFlange(bend.angle, pair.die));
  if (flange < advised && readHitId(bend.id) === null && bend.hem === null) say("minimum-flange", step.bends, [pair.die.id], `${name}: the flange of ${formatLength(flange, units)} is held by the die's edge only; ${formatLength(advised, units)} is usual for a V ${formatLength(pair.die.vOpening, units)}`);
}

/** The shop measured on another V than the die of this step has: the document gives the radius, and no single V makes every bend. */
function openingCaution(bend: Bend | undefined, vOpening: number, units: LengthUnit, say: Say): void {
  const measured = bend?.allowanceBasis?.shop?.vOpening;
  if (!bend || measured === undefined || Math.abs(measured - vOpening) <= SAME_OPENING * vOpening) return;
  say("tool-choice", [bend.id], [], `${bend.id}: the flat takes the shop's value for a V ${formatLength(measured, units)}, the step a V ${formatLength(vOpening, units)}; bend a trial first`);
}
