import type { FieldProblem } from "../core/problem";
import { deg, mm, toDeg, type Deg, type Mm } from "../core/units";
import type { MaterialFacts, MaterialLookup } from "../handbook/material";
import { ANGLE_STEP_DEG, angleClass } from "./angleClass";
import type { BendTrial } from "./bendTrial";
import { cellOf } from "./cellOf";
import type { FiledTrial } from "./filedTrial";
import type { ShopCell, ShopTable } from "./shopCell";
import { trialInMm } from "./trialInMm";
import { trialProblems } from "./trialProblems";
import type { RadiusSource } from "./trialResult";

/**
 * The shop's values out of its trials: filed by material, nominal thickness, V, punch radius and angle. Every trial given is found
 * again in the answer: counted, excluded, or refused with what cannot be true of it. The order of the trials does not matter.
 *
 * What is averaged is K, for one inside radius for each V (`radius`): at any thickness and angle it gives a deduction, so that trials a
 * few hundredths or tenths of a degree apart compare; a raw deduction would not (it grows with tan(angle / 2) and turns at 90 degrees).
 */
export function shopTable(trials: readonly BendTrial[], materials: MaterialLookup): ShopTable {
  const refused: { trial: string; problems: readonly FieldProblem[] }[] = [];
  const filed: FiledTrial[] = [];
  for (const trial of [...trials].sort(byDayAndId)) {
    const material = materials(trial.material);
    const problems = material ? trialProblems(trial, material) : [{ path: "material", message: `"${trial.material}" is not a material of the shop` }];
    if (material && problems.length === 0) filed.push(file(trial, material));
    else refused.push({ trial: trial.id, problems });
  }
  const byRadius = groups(filed, radiusKey);
  const cells = [...byRadius.values()].flatMap((sharing) => {
    const radius = sharedRadius(sharing);
    return [...groups(sharing, cellKey)].map(([key, here]) => cellOf(key, here, radius, angleRange));
  });
  return { cells: cells.sort(byPlace), refused };
}

function file(trial: BendTrial, material: MaterialFacts): FiledTrial {
  const measured = trialInMm(trial, material);
  return { trial, measured, vOpening: toHundredth(measured.vOpening), punchRadius: toHundredth(measured.punchRadius), angle: angleClass(toDeg(measured.angle)) };
}

/** Trials that share one inside radius: on one V whatever the angle, and whatever the punch as long as the radius follows from the V. */
const radiusKey = ({ trial, measured, vOpening, punchRadius }: FiledTrial): string =>
  [trial.material, measured.thicknessClass, vOpening, measured.followsDie ? "V" : punchRadius].join(" ");

const cellKey = ({ trial, measured, vOpening, punchRadius, angle }: FiledTrial): string =>
  `${trial.material} ${measured.thicknessClass} V${vOpening} R${punchRadius} ${angle}deg`;

function sharedRadius(trials: readonly FiledTrial[]): { readonly radius: Mm; readonly source: RadiusSource } {
  const radii = trials.flatMap(({ trial, measured }) => (trial.excluded || measured.measuredRadius === null ? [] : [measured.measuredRadius as number])).sort((a, b) => a - b);
  if (radii.length > 0) return { radius: mm(radii.reduce((sum, radius) => sum + radius, 0) / radii.length), source: "measured" };
  const first = trials[0]?.measured;
  return { radius: first?.expectedRadius ?? mm(0), source: first?.followsDie ? "natural radius of the V" : "punch radius" };
}

const angleRange = (middle: Deg): readonly [Deg, Deg] => [deg(middle - ANGLE_STEP_DEG / 2), deg(middle + ANGLE_STEP_DEG / 2)];

/** Noise of a conversion from inches must not make two of one size. */
const toHundredth = (value: Mm): Mm => mm(Math.round(value * 100 + 1e-7) / 100);

const byDayAndId = (a: BendTrial, b: BendTrial): number => compare(a.measuredOn, b.measuredOn) || compare(a.id, b.id);
const byPlace = (a: ShopCell, b: ShopCell): number =>
  compare(a.material, b.material) || a.thickness - b.thickness || a.vOpening - b.vOpening || a.punchRadius - b.punchRadius || a.angle - b.angle;
const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

function groups<T>(all: readonly T[], keyOf: (one: T) => string): ReadonlyMap<string, readonly T[]> {
  const found = new Map<string, T[]>();
  for (const one of all) {
    const key = keyOf(one);
    const group = found.get(key);
    if (group) group.push(one);
    else found.set(key, [one]);
  }
  return found;
}
