import { intersectIntervals } from "../geometry/intersectIntervals";
import type { Interval } from "../geometry/interval";
import type { BackGauge } from "../tooling/machine";
import type { GaugeOption } from "./gaugeOption";

/** Where the fingers stand, z from the stroke's middle; as far apart as possible. Empty when not even one can. */
export function placeFingers(option: GaugeOption, gauge: BackGauge, hitZ: number): readonly number[] {
  const reach: Interval = [gauge.z[0] - hitZ, gauge.z[1] - hitZ];
  const free = intersectIntervals(option.free, [reach]).filter(([from, to]) => to >= from);
  const [first, last] = [free[0], free[free.length - 1]];
  if (first === undefined || last === undefined) return [];
  const spread = last[1] - first[0];
  if (gauge.fingers >= 2 && spread >= gauge.minSpread) return [first[0], last[1]];
  const widest = free.reduce((best, piece) => (piece[1] - piece[0] > best[1] - best[0] ? piece : best), first);
  return gauge.fingers >= 1 ? [(widest[0] + widest[1]) / 2] : [];
}
