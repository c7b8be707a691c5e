import type { Mm, MPa, Rad } from "../core/units";

/** What a bend asks of its tools. */
export interface BendNeed {
  readonly thickness: Mm;
  /** Highest tensile strength of the material. */
  readonly tensile: MPa;
  /** Natural radius as a part of the V opening. */
  readonly naturalRadiusRatio: number;
  /** Angle turned through under load, springback included. */
  readonly demandedAngle: Rad;
  /** Inside radius under load. */
  readonly insideRadius: Mm;
  /** How far the V's natural radius may be off `insideRadius`; null when the radius follows from the die. */
  readonly radiusAllowance: Mm | null;
  /** Shortest outside flange beside the bend; null when nothing is known. */
  readonly shortestFlange: Mm | null;
}
