import { MM_PER_INCH } from "@/bending/core/units";
import type { Dimension } from "./quantityKind";

interface Unit {
  /** In mm, N, kg, degree. */
  readonly scale: number;
  readonly dimension: Dimension;
}

const length = (scale: number): Unit => ({ scale, dimension: [1, 0, 0, 0] });
const angle = (scale: number): Unit => ({ scale, dimension: [0, 0, 0, 1] });
const stress = (scale: number): Unit => ({ scale, dimension: [-2, 1, 0, 0] });
const force = (scale: number): Unit => ({ scale, dimension: [0, 1, 0, 0] });
const mass = (scale: number): Unit => ({ scale, dimension: [0, 0, 1, 0] });

/** International avoirdupois pound and standard gravity, both exact by definition. */
const POUND_KG = 0.45359237;
const GRAVITY = 9.80665;
const POUND_FORCE_N = POUND_KG * GRAVITY;

const named: readonly (readonly [names: string, unit: Unit])[] = [
  ["mm", length(1)], ["cm", length(10)], ["m", length(1000)], ["µm um", length(0.001)],
  ["in inch inches", length(MM_PER_INCH)], ["ft foot feet", length(12 * MM_PER_INCH)], ["thou mil mils", length(MM_PER_INCH / 1000)],
  ["deg degree degrees", angle(1)], ["rad", angle(180 / Math.PI)], ["arcmin", angle(1 / 60)], ["arcsec", angle(1 / 3600)],
  ["pa", stress(1e-6)], ["kpa", stress(1e-3)], ["mpa", stress(1)], ["gpa", stress(1000)], ["bar", stress(0.1)],
  ["psi", stress(POUND_FORCE_N / MM_PER_INCH ** 2)], ["ksi", stress((1000 * POUND_FORCE_N) / MM_PER_INCH ** 2)],
  ["n", force(1)], ["kn", force(1000)], ["kgf", force(GRAVITY)], ["lbf", force(POUND_FORCE_N)], ["kip kips", force(1000 * POUND_FORCE_N)],
  ["tonf ton-force", force(2000 * POUND_FORCE_N)], ["tf", force(1000 * GRAVITY)],
  ["g", mass(0.001)], ["kg", mass(1)], ["t tonne tonnes", mass(1000)], ["lb lbs", mass(POUND_KG)], ["oz", mass(POUND_KG / 16)],
];

/** Units by each of their names, in small letters. `tonf` is the US short ton-force (2000 lbf), `tf` the metric one (1000 kgf). */
export const quantityUnits: ReadonlyMap<string, Unit> = new Map(named.flatMap(([names, unit]) => names.split(" ").map((name) => [name, unit] as const)));
