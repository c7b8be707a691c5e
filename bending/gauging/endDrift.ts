import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import type { PartModel } from "../part/partModel";
import type { BendMotion } from "./bendMotion";
import { bentBend } from "./bentBend";
import { difference } from "./difference";
import type { Drift } from "./drift";
import { endPoint } from "./endPoint";
import { endPosition } from "./endPosition";
import type { DimensionEnd } from "./partDimension";
import { pointDrift } from "./pointDrift";

/** How the end of a dimension moves along its direction with the errors of the bends, seen from the dimension's face, as `frames` lay the faces out. */
export function endDrift(part: PartModel, frames: readonly Frame[], motions: readonly BendMotion[], seenFrom: number, end: DimensionEnd, direction: Vec3, way: 1 | -1): readonly Drift[] {
  const at = endPoint(part, end, null);
  const frame = frames[at.face];
  invariant(frame, "a dimension ends at a face of the part");
  const through = pointDrift(part, frames, motions, () => true, seenFrom, at.face, applyFrame(frame, at.point), direction);
  const bend = end.at === "point" ? null : part.bends[end.bend];
  if (end.at === "point" || !bend) return through;
  // The end's own bend also moves it within its face.
  const position = (shift: number, turn: number) => endPosition(frames, endPoint(part, end, bentBend(bend, shift, turn)), direction, way);
  const own: Drift = {
    bend: end.bend,
    shift: (position(difference.shift, 0) - position(-difference.shift, 0)) / (2 * difference.shift),
    turn: (position(0, difference.turn) - position(0, -difference.turn)) / (2 * difference.turn),
  };
  return [...through, own];
}
