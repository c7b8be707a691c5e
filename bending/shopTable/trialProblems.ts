import { formatLength } from "../core/formatLength";
import type { FieldProblem } from "../core/problem";
import { mm, mmPer, type Mm } from "../core/units";
import { bendAllowance } from "../handbook/bendAllowance";
import { bendDeduction } from "../handbook/bendDeduction";
import type { MaterialFacts } from "../handbook/material";
import { outsideSetback } from "../handbook/outsideSetback";
import type { BendTrial } from "./bendTrial";
import { trialInMm } from "./trialInMm";
import { trialK } from "./trialK";
import { uncertain } from "./uncertain";

/** A sheet farther from its nominal thickness than this part is another sheet. Own choice; standards allow about a tenth. */
const MOST_OFF_NOMINAL = 0.2;

/** What cannot be true of a trial, field by field, and what would be right, in the trial's own units. */
export function trialProblems(trial: BendTrial, material: MaterialFacts): readonly FieldProblem[] {
  const single = [...lengthProblems(trial), ...angleProblems(trial), ...instrumentProblems(trial), ...dateProblems(trial)];
  if (single.length > 0) return single;
  const together = togetherProblems(trial);
  return together.length > 0 ? together : bendProblems(trial, material);
}

function lengthProblems(trial: BendTrial): readonly FieldProblem[] {
  const over = (path: string, value: number | undefined | null, what: string): FieldProblem[] =>
    value === undefined || value === null || (Number.isFinite(value) && value > 0) ? [] : [{ path, message: `must be over 0: ${what}, in ${trial.units}` }];
  const notUnder = (path: string, value: number | undefined | null, what: string): FieldProblem[] =>
    value === undefined || value === null || (Number.isFinite(value) && value >= 0) ? [] : [{ path, message: `must be 0 or more: ${what}, in ${trial.units}` }];
  return [
    ...over("nominalThickness", trial.nominalThickness, "the thickness that the sheet was bought as"),
    ...over("thickness", trial.thickness, "the thickness as measured"),
    ...over("vOpening", trial.vOpening, "the opening of the die between its shoulders"),
    ...notUnder("punchRadius", trial.punchRadius, "the radius of the punch tip"),
    ...over("blankLength", trial.blankLength, "the length of the flat strip before bending"),
    ...over("flanges[0]", trial.flanges[0], "the outside length of the first leg"),
    ...over("flanges[1]", trial.flanges[1], "the outside length of the second leg"),
    ...notUnder("insideRadius", trial.insideRadius, "the radius inside the bend"),
  ];
}

function angleProblems({ angle }: BendTrial): readonly FieldProblem[] {
  if (Number.isFinite(angle) && angle > 0 && angle < 180) return [];
  return [{ path: "angle", message: "must be over 0 and under 180 degrees turned through: a right angle is 90, a leg bent by a third of that is 30" }];
}

function instrumentProblems({ instruments, units, insideRadius }: BendTrial): readonly FieldProblem[] {
  const wrong = (path: string, instrument: { readonly uncertainty: number; readonly resolution: number } | null | undefined, unit: string): FieldProblem[] =>
    instrument === null || instrument === undefined || (instrument.uncertainty > 0 && Number.isFinite(instrument.uncertainty) && instrument.resolution >= 0 && Number.isFinite(instrument.resolution))
      ? [] : [{ path, message: `the limit of error must be over 0 ${unit} and its step 0 or more: no instrument is without error` }];
  const measured = insideRadius !== null && insideRadius !== undefined;
  return [
    ...wrong("instruments.length", instruments.length, units),
    ...wrong("instruments.thickness", instruments.thickness, units),
    ...wrong("instruments.angle", instruments.angle, "degrees"),
    ...wrong("instruments.radius", instruments.radius, units),
    ...(measured && !instruments.radius ? [{ path: "instruments.radius", message: "say what the inside radius was measured with, or leave the radius out" }] : []),
  ];
}

function dateProblems({ measuredOn }: BendTrial): readonly FieldProblem[] {
  const right = /^\d{4}-\d{2}-\d{2}$/.test(measuredOn) && !Number.isNaN(Date.parse(measuredOn)) && new Date(measuredOn).toISOString().startsWith(measuredOn);
  return right ? [] : [{ path: "measuredOn", message: "must be a day as year-month-day, such as 2026-12-01" }];
}

function togetherProblems({ thickness, nominalThickness, vOpening, punchRadius, units }: BendTrial): readonly FieldProblem[] {
  const show = (value: number) => formatLength(value * mmPer(units), units);
  const problems: FieldProblem[] = [];
  if (nominalThickness !== undefined && Math.abs(thickness / nominalThickness - 1) > MOST_OFF_NOMINAL) {
    problems.push({ path: "thickness", message: `is ${show(thickness)}, but the sheet is named ${show(nominalThickness)}; ${show(nominalThickness * (1 - MOST_OFF_NOMINAL))} to ${show(nominalThickness * (1 + MOST_OFF_NOMINAL))} would be right` });
  }
  if (vOpening <= 2 * thickness) {
    problems.push({ path: "vOpening", message: `is ${show(vOpening)}; sheet of ${show(thickness)} does not go into a V of ${show(2 * thickness)} or less` });
  }
  if (punchRadius >= vOpening / 2) {
    problems.push({ path: "punchRadius", message: `is ${show(punchRadius)}, too round for a V of ${show(vOpening)}; less than half of it, ${show(vOpening / 2)}, would be right` });
  }
  return problems;
}

/** The legs must be longer than the bend itself, and the neutral line must lie in the sheet as far as the instruments can tell. */
function bendProblems(trial: BendTrial, material: MaterialFacts): readonly FieldProblem[] {
  const measured = trialInMm(trial, material);
  const { thickness: t, angle, flanges } = measured;
  const radius = measured.measuredRadius ?? measured.expectedRadius;
  const show = (value: Mm) => formatLength(value, trial.units);
  const setback = outsideSetback(angle, radius, t);
  const short = flanges.flatMap((flange, i): FieldProblem[] =>
    flange > setback ? [] : [{ path: `flanges[${i}]`, message: `is ${show(flange)}, but the bend alone takes ${show(setback)} of the leg; measure it outside, over the bend` }]);
  if (short.length > 0) return short;
  const found = trialK(measured, radius, measured.standard.radius);
  const k = uncertain(found.k, found.budget, "onK");
  if (k.value + k.expanded >= 0 && k.value - k.expanded <= 1) return [];
  const blankFor = (factor: number) => show(mm(flanges[0] + flanges[1] - bendDeduction(angle, radius, t, bendAllowance(angle, radius, factor, t))));
  return [{
    path: "blankLength",
    message: `is ${show(measured.blank)}; with these legs, angle and an inside radius of ${show(radius)} a blank of ${blankFor(0)} to ${blankFor(1)} would be right (the neutral line lies in the sheet). Check blank, legs and angle`,
  }];
}
