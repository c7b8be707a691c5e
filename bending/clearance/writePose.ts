import type { Mm, Rad } from "../core/units";
import type { Bend } from "../part/partModel";
import type { Die } from "../tooling/tool";
import { wingPose } from "./pose";
import { strokePlacement } from "./strokePlacement";

/** Writes the `POSE_NUMBERS` of an air bend at half the angle `h` from `at` on; without a die the tip's height is left 0. */
export function writePose(bend: Bend, thickness: Mm, die: Die | null, h: number, into: Float64Array, at: number): void {
  const { sin, cos, x, y } = wingPose(bend, thickness, h);
  into[at] = sin;
  into[at + 1] = cos;
  into[at + 2] = x;
  into[at + 3] = y;
  into[at + 4] = die ? strokePlacement(bend, thickness, die, (2 * h) as Rad).tipHeight : 0;
}
