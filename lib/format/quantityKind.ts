import type { LengthUnit } from "@/bending/core/units";

/** What a field asks for. Values are kept in mm, degrees, MPa, kN, kg, kg/m³; ratio and count are plain numbers. */
export type QuantityKind = "length" | "angle" | "stress" | "force" | "mass" | "density" | "ratio" | "count";

/** Exponents of mm, N, kg and degree. */
export type Dimension = readonly [length: number, force: number, mass: number, angle: number];

interface KindFacts {
  readonly dimension: Dimension;
  /** How many of the base unit (mm, N, kg, degree) one of the kept unit is. */
  readonly kept: number;
  /** The unit of a bare number, in either system of units; a name of `quantityUnits` or an expression of them. */
  readonly unit: Readonly<Record<LengthUnit, string>>;
  readonly article: string;
  readonly examples: string;
}

export const quantityKinds: Readonly<Record<QuantityKind, KindFacts>> = {
  length: { dimension: [1, 0, 0, 0], kept: 1, unit: { mm: "mm", in: "in" }, article: "a length", examples: "12.5, 3 1/2 in, (40+2) mm or 2*1.5 mm" },
  angle: { dimension: [0, 0, 0, 1], kept: 1, unit: { mm: "°", in: "°" }, article: "an angle", examples: "90, 22.5° or 180 - 60 deg" },
  stress: { dimension: [-2, 1, 0, 0], kept: 1, unit: { mm: "MPa", in: "ksi" }, article: "a strength", examples: "450 MPa, 65 ksi or 420 N/mm²" },
  force: { dimension: [0, 1, 0, 0], kept: 1000, unit: { mm: "kN", in: "tonf" }, article: "a force", examples: "800 kN, 90 tonf or 20000 lbf" },
  mass: { dimension: [0, 0, 1, 0], kept: 1, unit: { mm: "kg", in: "lb" }, article: "a mass", examples: "23 kg or 51 lb" },
  density: { dimension: [-3, 0, 1, 0], kept: 1e-9, unit: { mm: "kg/m³", in: "lb/in³" }, article: "a density", examples: "7850, 7.85 g/cm³ or 0.284 lb/in³" },
  ratio: { dimension: [0, 0, 0, 0], kept: 1, unit: { mm: "", in: "" }, article: "a plain number", examples: "0.44 or 1/3" },
  count: { dimension: [0, 0, 0, 0], kept: 1, unit: { mm: "", in: "" }, article: "a whole number", examples: "4" },
};
