import type { Mm, Rad } from "../core/units";

/** V opening taken between the tops of the shoulder arcs, where the arcs are tangent to the die's top plane. */
export interface OpeningBetweenTops {
  readonly measured: "between-tops";
  readonly opening: Mm;
  readonly shoulderRadius: Mm;
}

/** V opening taken between the sharp corners that the faces and the top plane would have without the shoulder arcs. */
export interface OpeningBetweenCorners {
  readonly measured: "between-corners";
  readonly opening: Mm;
  readonly shoulderRadius: Mm;
  /** Angle between the two faces of the V. */
  readonly dieAngle: Rad;
}

/** The two ways of naming a V differ by several tenths of a millimetre, so a formula takes one that says which it is. */
export type DieOpening = OpeningBetweenTops | OpeningBetweenCorners;
