import { MM_PER_INCH, type LengthUnit } from "@/bending/core/units";
import { formatNumber } from "./formatNumber";

/** What an answer is: lengths in mm, angles in degrees, forces in kN, forces a length in kN/m, stress in MPa, mass in kg, areas in m², work in J. */
export type MeasureKind = "length" | "angle" | "force" | "force-per-length" | "stress" | "mass" | "density" | "area" | "work" | "ratio" | "count";

interface Way {
  /** How many of this unit one kept unit is. */
  readonly times: number;
  readonly unit: string;
  readonly digits: number;
}

/** One US short ton-force, 2000 lbf, in kN. */
const TONF_KN = 8.896443230521;
const same = (unit: string, digits: number): Readonly<Record<LengthUnit, Way>> => ({ mm: { times: 1, unit, digits }, in: { times: 1, unit, digits } });

const ways: Readonly<Record<MeasureKind, Readonly<Record<LengthUnit, Way>>>> = {
  length: { mm: { times: 1, unit: "mm", digits: 3 }, in: { times: 1 / MM_PER_INCH, unit: "in", digits: 4 } },
  angle: same("°", 2),
  force: { mm: { times: 1, unit: "kN", digits: 1 }, in: { times: 1 / TONF_KN, unit: "tonf", digits: 2 } },
  "force-per-length": { mm: { times: 1, unit: "kN/m", digits: 1 }, in: { times: 0.3048 / TONF_KN, unit: "tonf/ft", digits: 2 } },
  stress: { mm: { times: 1, unit: "MPa", digits: 1 }, in: { times: 1 / 6.894757293168, unit: "ksi", digits: 2 } },
  mass: { mm: { times: 1, unit: "kg", digits: 3 }, in: { times: 1 / 0.45359237, unit: "lb", digits: 3 } },
  density: { mm: { times: 1, unit: "kg/m³", digits: 0 }, in: { times: (MM_PER_INCH / 1000) ** 3 / 0.45359237, unit: "lb/in³", digits: 4 } },
  area: { mm: { times: 1, unit: "m²", digits: 3 }, in: { times: 1 / 0.09290304, unit: "ft²", digits: 2 } },
  work: { mm: { times: 1, unit: "J", digits: 0 }, in: { times: 0.7375621493, unit: "ft·lbf", digits: 0 } },
  ratio: same("", 4),
  count: same("", 0),
};

/** The number alone, in the unit that the system of units uses for it. */
export const quantityNumber = (value: number, kind: MeasureKind, system: LengthUnit): string => formatNumber(value * ways[kind][system].times, ways[kind][system].digits);

export const quantityUnit = (kind: MeasureKind, system: LengthUnit): string => ways[kind][system].unit;

/** What one kept unit (mm, kN, kg) is in the system's unit: for the axes of charts. */
export const quantityScale = (kind: MeasureKind, system: LengthUnit): number => ways[kind][system].times;

/** With its unit: `3.122 mm`, `0.1229 in`, `90°`. Unlike `formatLength`, one digit finer than the shop measures, so that sums of answers add up. */
export function formatQuantity(value: number, kind: MeasureKind, system: LengthUnit): string {
  const unit = quantityUnit(kind, system);
  return `${quantityNumber(value, kind, system)}${unit === "" || unit === "°" ? unit : ` ${unit}`}`;
}
