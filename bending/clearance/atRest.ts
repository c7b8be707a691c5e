import type { Mm, Rad } from "../core/units";
import type { Bend } from "../part/partModel";
import { POSE_NUMBERS, type StrokeMotion } from "./strokeMotion";
import { writePose } from "./writePose";

/** The part at rest at one angle of an air bend, seen from the punch. */
export function atRest(bend: Bend, thickness: Mm, angle: Rad): StrokeMotion {
  const pose = new Float64Array(POSE_NUMBERS);
  writePose(bend, thickness, null, angle / 2, pose, 0);
  return { angle: () => angle, steps: () => 0, poses: () => pose };
}
