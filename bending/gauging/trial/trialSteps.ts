import { straightPunch, trialMachine, vDie } from "../../clearance/trial/trialTools";
import { invariant } from "../../core/invariant";
import type { PartModel } from "../../part/partModel";
import type { GaugeOption } from "../../setup/gaugeOption";
import { gaugeOptions } from "../../setup/gaugeOptions";
import type { GaugedStep } from "../gaugedStep";
import { touchOf } from "../touchOf";

export const punch = straightPunch("P88");
export const die = vDie("V16");
export const FINGER_HEIGHT = 12;
export const machine = { ...trialMachine, gauge: { ...trialMachine.gauge, fingerProfile: [[0, 0], [50, 0], [50, FINGER_HEIGHT], [0, FINGER_HEIGHT]] as const } };

/** What a step is to be gauged from: the first way of this kind, or the one that touches this face. */
export type Wanted = "edge" | "face" | ((option: GaugeOption) => boolean);

/** The steps of an order, each with its bend, the face in front and what it is gauged from. */
export function trialSteps(part: PartModel, order: readonly (readonly [bend: number, front: number, wanted: Wanted])[]): readonly GaugedStep[] {
  let formed = 0;
  return order.map(([bend, front, wanted]): GaugedStep => {
    const hit = { bends: [bend], front, formed };
    formed |= 1 << bend;
    const options = gaugeOptions(part, hit, machine);
    const option = options.find((one) => (typeof wanted === "string" ? one.on === wanted : wanted(one)));
    invariant(option, `bend ${bend} cannot be gauged so, only: ${JSON.stringify(options)}`);
    return { ...hit, touch: touchOf(part, hit, option, FINGER_HEIGHT) };
  });
}
