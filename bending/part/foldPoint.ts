import { applyFrame } from "../geometry/applyFrame";
import { invariant } from "../core/invariant";
import type { PartPoint, Vec3 } from "../geometry/vec3";
import { foldFrames } from "./foldFrames";
import type { FormedAngles, PartModel } from "./partModel";

/** Where a point of a face, given in the unfolded sheet, is when the part is formed to `angles`. */
export function foldPoint(part: PartModel, face: number, angles: FormedAngles, sheet: Vec3): PartPoint {
  const frame = foldFrames(part, angles)[face];
  invariant(frame, "foldPoint: a face of the part");
  return applyFrame(frame, sheet);
}
