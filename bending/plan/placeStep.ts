import type { OrderStep } from "../order/orderProblem";
import type { GaugeOption } from "../setup/gaugeOption";
import type { Layout } from "../setup/layout";
import { placeFingers } from "../setup/placeFingers";
import { placeOnStation } from "../setup/placeOnStation";
import { freeIntervals } from "../geometry/freeIntervals";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { PlacedStation } from "../setup/layout";
import { offCentreReach } from "../tooling/offCentre";
import type { StepChecks } from "./createStepChecks";
import { neighboursBesideFingers } from "./neighboursBesideFingers";
import type { Situation } from "./situation";
import { stepLoad } from "./stepLoad";

export interface StepPlace {
  /** Middle of the stroke's line along the bed. */
  readonly hitZ: number;
  /** How the sheet is located; null when nothing behind the die can be touched. Finger places from the stroke's middle. */
  readonly gauge: { readonly option: GaugeOption; readonly fingers: readonly number[] } | null;
}

/** Where on the bed a step is made and how it is gauged; null when it cannot be made there. */
export function placeStep(situation: Situation, checks: StepChecks, layout: Layout, { move, formed, station }: OrderStep): StepPlace | null {
  const { machine, pairs, moves } = situation;
  const own = layout.stations[station];
  const halfLength = moves[move]?.halfLength;
  if (own === undefined || halfLength === undefined || !checks.possible(move, formed, own.pair)) return null;
  const shift = placeOnStation(halfLength, own, layout.stations, (other) => {
    const tools = pairs[other.pair];
    return tools === undefined ? { punch: [], die: [] } : {
      punch: checks.forbidden(move, formed, own.pair, tools.punch),
      die: checks.forbidden(move, formed, own.pair, tools.die),
    };
  }, machine.settings, machine.settings.offCentre ? loadLimits(situation, checks, own, { move, formed }) : undefined);
  if (shift === null) return null;
  const hitZ = own.z + shift;
  const option = checks.gauges(move, formed, own.pair)[0];
  return { hitZ, gauge: option === undefined ? null : { option, fingers: fingersOf(situation, layout, own, option, hitZ) } };
}

/** The fingers keep off the tools of the other stations. */
function fingersOf(situation: Situation, layout: Layout, own: PlacedStation, option: GaugeOption, hitZ: number): readonly number[] {
  const taken = neighboursBesideFingers(situation, layout, own, option, hitZ);
  const free = taken.length === 0 ? option.free : option.free.flatMap((span) => freeIntervals(span, mergeIntervals(taken)));
  return placeFingers({ ...option, free }, situation.machine.gauge, hitZ);
}

/** Where on a station the line's middle may lie, from the station's, so that the machine bears the load as far from the middle of its bed. */
function loadLimits(situation: Situation, checks: StepChecks, own: PlacedStation, step: Pick<OrderStep, "move" | "formed">): Interval {
  const { forceKN, offset } = stepLoad(situation, checks, own, step);
  const reach = offCentreReach(situation.machine, forceKN);
  return [-reach - own.z - offset, reach - own.z - offset];
}
