import { mm } from "@/bending/core/units";
import { FORCE_V_RANGE } from "@/bending/handbook/airBendForce";
import { airBendForces } from "@/bending/handbook/airBendForces";
import type { Question } from "./question";

const STEPS = 48;

export interface ForceCurve {
  readonly name: string;
  /** V in mm, force in kN for the whole length. */
  readonly points: readonly (readonly [number, number])[];
}

/** Force over V by the three published forms, for V from 5 to 20 times the thickness, or further where the V asked about lies outside. */
export function forceCurves({ tensile, thickness, vOpening, number }: Question): readonly ForceCurve[] {
  const [from, to] = [Math.min(FORCE_V_RANGE[0] * thickness, vOpening), Math.max(FORCE_V_RANGE[1] * thickness, vOpening)];
  const openings = Array.from({ length: STEPS + 1 }, (_, i) => from + ((to - from) * i) / STEPS);
  const rows = openings.map((v) => airBendForces(tensile, thickness, mm(v)).forms.map(({ perMetre }) => (perMetre * number("l")) / 1000));
  return ["1.33 form", "1.42 form", "Oehler"].map((name, form) => ({ name, points: openings.map((v, i) => [v, rows[i]?.[form] ?? NaN] as const) }));
}
