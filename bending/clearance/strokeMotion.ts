import type { Bounds } from "./half";

/** Numbers that a sample takes in `poses`: sine and cosine of the wing's slope, x and y of its tangent over the punch's tip (see `WingPose`), and the tip's height over the die. */
export const POSE_NUMBERS = 5;

/** How the wing at the back moves in a stroke, seen from the punch or from the die. */
export interface StrokeMotion {
  /** Angle turned through at a sample. */
  readonly angle: (sample: number, steps: number) => number;
  /** Into how many equal steps of the angle the stroke is cut, so that no corner within the bounds travels more than the margin in one. */
  readonly steps: (reach: Pick<Bounds, "a" | "b">) => number;
  /** The samples 0 to `steps`, `POSE_NUMBERS` each. */
  readonly poses: (steps: number) => Float64Array;
}
