import { deg, mm, mmPer, toRad, type Mm, type Rad } from "../core/units";
import type { MaterialFacts } from "../handbook/material";
import { naturalRadius } from "../handbook/naturalRadius";
import type { BendTrial, Instrument } from "./bendTrial";
import { standardOf } from "./standardOf";
import { thicknessClass } from "./thicknessClass";

/** A trial in mm and radians, the instruments as standard uncertainties. */
export interface TrialInMm {
  readonly thickness: Mm;
  readonly thicknessClass: Mm;
  readonly vOpening: Mm;
  readonly punchRadius: Mm;
  readonly angle: Rad;
  readonly blank: Mm;
  readonly flanges: readonly [Mm, Mm];
  readonly measuredRadius: Mm | null;
  /** The inside radius follows from the V; else the punch is rounder than what the V gives, and the radius is the punch's. */
  readonly followsDie: boolean;
  /** The larger of natural radius and punch radius. */
  readonly expectedRadius: Mm;
  readonly standard: { readonly length: Mm; readonly thickness: Mm; readonly angle: Rad; readonly radius: Mm };
}

export function trialInMm(trial: BendTrial, material: MaterialFacts): TrialInMm {
  const per = mmPer(trial.units);
  const length = (value: number) => mm(value * per);
  const error = (instrument: Instrument) => length(standardOf(instrument));
  const { instruments } = trial;
  const [vOpening, punchRadius] = [length(trial.vOpening), length(trial.punchRadius)];
  const natural = naturalRadius(material, vOpening);
  return {
    thickness: length(trial.thickness),
    thicknessClass: thicknessClass(trial, material.group),
    vOpening,
    punchRadius,
    angle: toRad(deg(trial.angle)),
    blank: length(trial.blankLength),
    flanges: [length(trial.flanges[0]), length(trial.flanges[1])],
    measuredRadius: trial.insideRadius === null || trial.insideRadius === undefined ? null : length(trial.insideRadius),
    followsDie: punchRadius <= natural,
    expectedRadius: mm(Math.max(natural, punchRadius)),
    standard: {
      length: error(instruments.length),
      thickness: error(instruments.thickness ?? instruments.length),
      angle: toRad(deg(standardOf(instruments.angle))),
      radius: instruments.radius ? error(instruments.radius) : mm(0),
    },
  };
}
