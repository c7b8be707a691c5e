import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { invertFrame } from "../geometry/invertFrame";
import type { PartPoint, Vec3 } from "../geometry/vec3";
import { foldFrames } from "./foldFrames";
import type { FormedAngles, PartModel } from "./partModel";

/** Undoes `foldPoint`: where a point of a face of the formed part lies in the unfolded sheet. */
export function unfoldPoint(part: PartModel, face: number, angles: FormedAngles, folded: PartPoint): Vec3 {
  const frame = foldFrames(part, angles)[face];
  invariant(frame, "unfoldPoint: a face of the part");
  return applyFrame(invertFrame(frame), folded);
}
