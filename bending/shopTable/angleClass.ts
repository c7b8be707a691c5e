import { deg, type Deg } from "../core/units";

/** Degrees. Trials are filed by the nearest multiple of this: wide enough for what a brake repeats, narrow enough to be one angle. Own choice. */
export const ANGLE_STEP_DEG = 5;

/** Middle of the angle range of a bend, degrees turned through; the range is half a step to each side, its upper end left out. */
export function angleClass(angle: Deg): Deg {
  return deg(Math.floor(angle / ANGLE_STEP_DEG + 0.5 + 1e-9) * ANGLE_STEP_DEG);
}
