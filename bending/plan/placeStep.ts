import type { OrderStep } from "../order/orderProblem";
import type { GaugeOption } from "../setup/gaugeOption";
import type { Layout } from "../setup/layout";
import { placeFingers } from "../setup/placeFingers";
import { placeOnStation } from "../setup/placeOnStation";
import type { StepChecks } from "./createStepChecks";
import type { Situation } from "./situation";

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
  }, machine.settings);
  if (shift === null) return null;
  const hitZ = own.z + shift;
  const option = checks.gauges(move, formed, own.pair)[0];
  return { hitZ, gauge: option === undefined ? null : { option, fingers: placeFingers(option, machine.gauge, hitZ) } };
}
