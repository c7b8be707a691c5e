import type { GaugeOption } from "../setup/gaugeOption";
import type { BackGauge } from "../tooling/machine";

/** How many fingers an option can hold at most, wherever on the bed. */
export function fingerCount(option: GaugeOption, gauge: BackGauge): number {
  const [first, last] = [option.free[0], option.free[option.free.length - 1]];
  if (first === undefined || last === undefined) return 0;
  return gauge.fingers >= 2 && last[1] - first[0] >= gauge.minSpread ? 2 : Math.min(1, gauge.fingers);
}
