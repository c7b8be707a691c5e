import { createHitPlaces } from "../clearance/createHitPlaces";
import type { Hit } from "../clearance/hit";
import type { PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";
import { createGaugeOptions } from "./createGaugeOptions";
import type { GaugeOption } from "./gaugeOption";

/** Every way to locate the sheet before one stroke, best first: see `createGaugeOptions`. */
export function gaugeOptions(part: PartModel, hit: Hit, machine: Machine): readonly GaugeOption[] {
  const halves = createHitPlaces(part, machine.settings.clearance, { clips: 0, entries: 0 })(hit);
  return createGaugeOptions(part, machine.gauge)(halves, hit.formed);
}
