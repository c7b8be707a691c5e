import type { Mm } from "../core/units";
import type { Interval } from "../geometry/interval";
import type { PlacedShape } from "./placedShape";
import type { StrokeMotion } from "./strokeMotion";

/** How much was worked out. */
export interface Counts {
  clips: number;
  entries: number;
}

/** What a half is asked: does anything of it come within the margin of a shape, while it moves so? */
export interface Question {
  /** Numbered within the half. */
  readonly index: number;
  readonly shape: PlacedShape;
  /** Height of the shape's origin over the punch's tip, or over the die's top plane when it stands on the bed. */
  readonly lift: number;
  readonly onBed: boolean;
  readonly motion: StrokeMotion;
  /** Met anywhere, this shape is met on the way along the bed: at every z. */
  readonly everywhere: PlacedShape | null;
  readonly margin: Mm;
  readonly counts: Counts;
}

/** All of the bed. */
export const EVERYWHERE: Interval = [-1e6, 1e6];
