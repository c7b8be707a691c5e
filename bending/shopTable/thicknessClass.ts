import { mm, mmPer, type Mm } from "../core/units";
import { gaugeSystemOf } from "../handbook/gaugeSystemOf";
import { gaugeThickness } from "../handbook/gaugeThickness";
import type { MaterialGroup } from "../handbook/material";
import { GAUGE_RANGE } from "../handbook/usStandardGauge";
import type { BendTrial } from "./bendTrial";

/** mm. Usual thicknesses of metric sheet; common practice, no source. */
const METRIC_MM = [0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10, 12, 15, 20] as const;
/** Plate and sheet by fractions of an inch, in sixteenths. */
const SIXTEENTHS = [1, 2, 3, 4, 5, 6, 8, 10, 12] as const;

/** A measured thickness farther than this part from every usual one is a class of its own. Own choice: half a gauge. */
const FARTHEST = 0.12;

/**
 * The nominal thickness that a trial is filed under, in mm, to a hundredth: as the trial names it, else the nearest usual one (of
 * metric sheet, or for a trial in inches of gauges and fractions), else the measured one.
 */
export function thicknessClass({ units, thickness, nominalThickness }: Pick<BendTrial, "units" | "thickness" | "nominalThickness">, group: MaterialGroup): Mm {
  if (nominalThickness !== undefined) return toHundredth(nominalThickness * mmPer(units));
  const measured = thickness * mmPer(units);
  const off = (usual: number) => Math.abs(Math.log(measured / usual));
  const [first, ...others] = units === "in" ? inchSizes(group) : METRIC_MM;
  const nearest = others.reduce<number>((best, usual) => (off(usual) < off(best) ? usual : best), first ?? measured);
  return toHundredth(off(nearest) <= FARTHEST ? nearest : measured);
}

function inchSizes(group: MaterialGroup): readonly number[] {
  const system = gaugeSystemOf(group);
  const fractions = SIXTEENTHS.map((count) => (count * 25.4) / 16);
  if (system === null) return fractions;
  const gauges = Array.from({ length: GAUGE_RANGE.to - GAUGE_RANGE.from + 1 }, (_, i) => gaugeThickness(GAUGE_RANGE.from + i, system));
  return [...gauges.flatMap((size) => (size === null ? [] : [size as number])), ...fractions];
}

/** Noise of a conversion from inches must not decide on which side of a half a value falls. */
const toHundredth = (value: number): Mm => mm(Math.round(value * 100 + 1e-7) / 100);
