import { materialById } from "@/bending";
import { forceForms } from "@/bending/handbook/forceForms";
import { radiusRules } from "@/bending/handbook/radiusRules";

/** Sizes in mm that fit one another, an angle in radians, and choices to take forms and rules by. */
export interface Sizes {
  readonly thickness: number;
  readonly radius: number;
  readonly opening: number;
  readonly shoulder: number;
  readonly length: number;
  readonly angle: number;
  readonly choice: number;
}

export interface Door {
  /** Its arguments, every length through `l`. */
  readonly args: (sizes: Sizes, l: (length: number) => number) => readonly unknown[];
  /** Power of length that its numbers have. */
  readonly power?: number;
}

const steel = materialById("S235");
const door = (args: Door["args"], power = 1): Door => ({ args, power });
const die = ({ opening, shoulder }: Sizes, l: (length: number) => number) => ({ vOpening: l(opening), shoulderRadius: l(shoulder) });
const named = ({ opening, shoulder, choice }: Sizes, l: (length: number) => number) =>
  ({ measured: choice % 2 === 0 ? "between-tops" : "between-corners", opening: l(opening), shoulderRadius: l(shoulder), dieAngle: 1.4 });
const of = <T>(list: readonly T[], { choice }: Sizes) => list[choice % list.length];
const bend: Door["args"] = ({ angle, radius, thickness }, l) => [angle, l(radius), l(thickness)];

/** Doors whose formulas know no size of their own: all lengths in inches give the same answer in inches. */
export const scaledDoors: Readonly<Record<string, Door>> = {
  airBendForce: door(({ thickness, opening }, l) => [400, l(thickness), l(opening)]),
  airBendForces: door(({ thickness, opening }, l) => [400, l(thickness), l(opening)]),
  apexDeduction: door((s, l) => [...bend(s, l), l(s.length)]),
  apexSetback: door(bend),
  bendAfterRelease: door(({ angle, radius, thickness }, l) => [{ angle, radius: l(radius) }, l(thickness), 0.95]),
  bendAllowance: door(({ angle, radius, thickness }, l) => [angle, l(radius), 0.42, l(thickness)]),
  bendDeduction: door((s, l) => [...bend(s, l), l(s.length)]),
  bendToHemDistance: door(({ thickness, radius, shoulder }, l) => [l(thickness), l(radius), l(shoulder)]),
  bendUnderLoad: door(({ angle, radius, thickness }, l) => [{ angle, radius: l(radius) }, l(thickness), 0.95]),
  bendingWork: door(({ length }, l) => [40, l(length)]),
  chartForce: door((s, l) => [of(["v", "channel", "hat", "offset"], s), "air", l(s.thickness)]),
  din6935CompensatingValue: door(({ angle, radius, thickness }, l) => [Math.PI - angle, l(radius), l(thickness)]),
  din6935Factor: door(({ radius, thickness }, l) => [l(radius), l(thickness)], 0),
  faaAllowance: door(bend),
  flangeAtContact: door((s, l) => [s.angle, named(s, l)]),
  genericK: door((s, l) => [of(["soft", "medium", "hard"], s), l(s.radius), l(s.thickness)], 0),
  grooverK: door(({ radius, thickness }, l) => [l(radius), l(thickness)], 0),
  hemDeduction: door(({ thickness, shoulder }, l) => [l(thickness), l(shoulder)]),
  hemSteps: door(({ thickness }, l) => [l(thickness)]),
  holeOverDie: door(({ length, opening }, l) => [l(length), l(opening)], 0),
  holeToBend: door((s, l) => [{ kind: of(["round", "countersink", "counterbore"], s) }, l(s.thickness), l(s.radius)]),
  insideSetback: door(({ angle, radius }, l) => [angle, l(radius)]),
  kFactorFromDeduction: door(({ length, angle, radius, thickness }, l) => [l(length), angle, l(radius), l(thickness)], 0),
  kFromAllowance: door(({ length, angle, radius, thickness }, l) => [l(length), angle, l(radius), l(thickness)], 0),
  legToApex: door((s, l) => [l(s.length), ...bend(s, l)]),
  legToOutermostTangent: door((s, l) => [l(s.length), ...bend(s, l)]),
  minimumCurlRadius: door(({ thickness }, l) => [l(thickness)]),
  minimumFlange: door((s, l) => [s.angle, die(s, l)]),
  naturalRadius: door(({ opening }, l) => [steel, l(opening)]),
  onePersonArea: door(({ thickness }, l) => [l(thickness), 7850], -1),
  openingBetweenTops: door((s, l) => [named(s, l)]),
  outsideSetback: door(bend),
  penetrationDepth: door((s, l) => [...bend(s, l), die(s, l)]),
  publishedForce: door((s, l) => [of(forceForms, s), 400, l(s.thickness), l(s.opening)]),
  punchTravel: door((s, l) => [...bend(s, l), named(s, l)]),
  radiusByReduction: door(({ thickness }, l) => [20, l(thickness)]),
  radiusByRule: door((s, l) => [of(radiusRules, s), l(s.opening)]),
  radiusBySteps: door(({ angle, radius, thickness, shoulder }, l) => [angle, l(radius), l(thickness), 0.44, { insidePitch: l(shoulder) }]),
  resolveAllowance: door((s, l) => [{ rule: of(["din6935", "machinery", "faa", "shop", undefined], s), material: steel, thickness: l(s.thickness), insideRadius: l(s.radius), angle: s.angle }]),
  sharpBendLimit: door(({ thickness }, l) => [l(thickness)]),
  sheetMass: door(({ length, opening, thickness }, l) => [l(length), l(opening), l(thickness), 7850], 3),
  softHardRadius: door((s, l) => ["titanium", of(["soft", "hard"], s), l(s.thickness)]),
  springback: door((s, l) => [...bend(s, l), { ...steel, springbackRow: of([null, "DC01", "X12CrNi18-8"], s) }]),
  springbackRatio: door(({ radius, thickness }, l) => [l(radius), l(thickness), steel]),
  squareCornerDeduction: door((s, l) => [2, l(s.thickness), of(["v-die", "drawn"], s)]),
  straightLength: door((s, l) => [of(["soft", "medium", "hard"], s), ...bend(s, l)]),
  tensileScaledRadius: door(({ opening }, l) => [500, l(opening)]),
  vOpeningForMethod: door((s, l) => [l(s.thickness), of(["coining", "partial"], s)]),
};

/** Doors that read a table by size, or add one: a length has to come to them in mm, whatever unit it was given in. */
export const sizedDoors: Readonly<Record<string, Door>> = {
  aluminiumMinimumRadius: door(({ thickness }, l) => ["6061-T6", l(thickness)]),
  coldProfileTolerance: door(({ length, thickness }, l) => ["bend-to-bend", l(length), l(thickness)]),
  empiricalK: door((_, l) => ["aluminium", l(0.03 * 25.4), l(0.063 * 25.4)], 0),
  en485MinimumRadius: door(({ thickness }, l) => [l(thickness)]),
  flangeWithMargin: door((s, l) => [s.angle, named(s, l)]),
  gaugeForThickness: door(({ thickness }, l) => [l(thickness), "steel"]),
  generalAngleTolerance: door(({ length }, l) => ["m", l(length)], 0),
  generalLengthTolerance: door(({ length }, l) => ["m", l(length)]),
  liftingLimit: door(({ length }, l) => [{ horizontal: l(length), height: l(750), travel: l(250), asymmetry: 0 }], 0),
  lowCarbonMinimumRadius: door(({ thickness }, l) => [l(thickness)]),
  minimumRadius: door(({ thickness, angle }, l) => [steel, l(thickness), angle]),
  reliefSize: door(({ thickness, radius }, l) => [l(thickness), l(radius)]),
  vOpeningChart: door(({ thickness }, l) => [l(thickness)]),
  vOpeningRule: door(({ thickness }, l) => [l(thickness)]),
};

/** Numbers of an answer that are no lengths, whatever the door gives besides. */
export const PURE_NUMBERS: ReadonlySet<string> = new Set(["angle", "angleRatio", "radiusRatio", "anglePerHit", "hits", "k", "spread", "dieAngle", "preBendOpening", "preBendTurned"]);
