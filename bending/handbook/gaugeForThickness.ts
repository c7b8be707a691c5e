import { mm, type Mm } from "../core/units";
import { gaugeThickness, type GaugeSystem } from "./gaugeThickness";
import { GAUGE_RANGE } from "./usStandardGauge";

export interface NearestGauge {
  readonly gauge: number;
  readonly nominal: Mm;
  /** Measured less nominal. */
  readonly deviation: Mm;
}

const { from: THICKEST, to: THINNEST } = GAUGE_RANGE;

/**
 * The gauge whose nominal thickness is nearest, of the charts of `gaugeThickness` (7 to 30). Null for a sheet that lies
 * farther outside the chart than half its last step.
 */
export function gaugeForThickness(thickness: Mm, system: GaugeSystem): NearestGauge | null {
  const nominal = (gauge: number): number => gaugeThickness(gauge, system) ?? NaN;
  const above = nominal(THICKEST) + (nominal(THICKEST) - nominal(THICKEST + 1)) / 2;
  const below = nominal(THINNEST) - (nominal(THINNEST - 1) - nominal(THINNEST)) / 2;
  if (!(thickness <= above && thickness >= below)) return null;
  let gauge = THICKEST;
  for (let next = THICKEST + 1; next <= THINNEST; next += 1) {
    if (Math.abs(nominal(next) - thickness) < Math.abs(nominal(gauge) - thickness)) gauge = next;
  }
  return { gauge, nominal: mm(nominal(gauge)), deviation: mm(thickness - nominal(gauge)) };
}
