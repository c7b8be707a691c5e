import type { Mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import type { Hit } from "../clearance/hit";
import type { GaugeOption } from "../setup/gaugeOption";
import { askedTolerance } from "./askedTolerance";
import { bendMotion } from "./bendMotion";
import { depthDrift } from "./depthDrift";
import type { Drift } from "./drift";
import type { Repeats } from "./gaugedStep";
import { legDimensions } from "./legDimensions";
import { missWhenGauged, type AskedLength } from "./missWhenGauged";
import { touchOf } from "./touchOf";

/** What the lengths that the part document asks for say to the ways of gauging a stroke. */
export interface Keeping {
  /** The ways to gauge, those first that hold the lengths asked for; never fewer fingers for it. Only bends behind the die count. */
  readonly preferred: (hit: Hit, options: readonly GaugeOption[]) => readonly GaugeOption[];
  /** How many of the lengths that the stroke decides are not held when it is gauged so. */
  readonly unkept: (hit: Hit, option: GaugeOption) => number;
}

const SLACK_MM = 1e-9;

/** Null when the document asks for no length. An option belongs to one stroke and one state behind the die; `fingers` says how many can touch. */
export function createKeeping(part: PartModel, repeats: Repeats, fingerHeight: number, fingers: (option: GaugeOption) => number): Keeping | null {
  const asked = legDimensions(part).flatMap((dimension): readonly AskedLength[] => {
    const tolerance: Mm | null = askedTolerance(part, dimension);
    return tolerance === null ? [] : [{ dimension, tolerance }];
  });
  if (asked.length === 0) return null;
  const motions = part.bends.map((bend) => bendMotion(part, bend));
  const drifts = new WeakMap<GaugeOption, readonly Drift[]>();
  /** By how much each length asked for may be missed over what is asked. */
  const over = (hit: Hit, option: GaugeOption): readonly number[] => {
    const drift = drifts.get(option) ?? depthDrift(part, { ...hit, touch: touchOf(part, hit, option, fingerHeight) }, motions);
    drifts.set(option, drift);
    return missWhenGauged(part, hit, drift, repeats, asked).map((miss, i) => Math.max(0, miss - (asked[i]?.tolerance ?? 0) - SLACK_MM));
  };
  const unkept = (hit: Hit, option: GaugeOption) => over(hit, option).filter((by) => by > 0).length;
  const excess = (hit: Hit, option: GaugeOption) => over(hit, option).reduce((sum, by) => sum + by, 0);
  return {
    unkept,
    preferred: (hit, options) => (options.length < 2 ? options : [...options].sort((a, b) =>
      fingers(b) - fingers(a) || unkept(hit, a) - unkept(hit, b) || excess(hit, a) - excess(hit, b))),
  };
}
