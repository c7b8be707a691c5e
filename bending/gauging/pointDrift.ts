import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { dotProduct } from "../geometry/dotProduct";
import type { Frame } from "../geometry/frame";
import { invertFrame } from "../geometry/invertFrame";
import { turnByFrame } from "../geometry/turnByFrame";
import type { Vec3 } from "../geometry/vec3";
import type { PartModel } from "../part/partModel";
import type { BendMotion } from "./bendMotion";
import { bendsBetween } from "./bendsBetween";
import type { Drift } from "./drift";

/**
 * How a place of one face moves along `direction`, seen from another face, with the errors of the bends between the two. `place`
 * and `direction` are in the coordinates into which `frames` lay the faces. Only bends that `isFormed` have errors.
 */
export function pointDrift(
  part: PartModel, frames: readonly Frame[], motions: readonly BendMotion[], isFormed: (bend: number) => boolean,
  seenFrom: number, face: number, place: Vec3, direction: Vec3,
): readonly Drift[] {
  return bendsBetween(part, seenFrom, face).filter(({ bend }) => isFormed(bend)).map(({ bend: index, outwards }): Drift => {
    const [bend, motion] = [part.bends[index], motions[index]];
    const [parent, child] = [frames[bend?.parent ?? -1], frames[bend?.child ?? -1]];
    invariant(parent && child && motion, "a bend joins two faces");
    const inChild = applyFrame(invertFrame(child), place);
    // What lies on the child's side moves so; seen from there, all else moves the other way.
    const along = (by: Frame) => dotProduct(direction, turnByFrame(parent, applyFrame(by, inChild))) * (outwards ? 1 : -1);
    return { bend: index, shift: along(motion.shift), turn: along(motion.turn) };
  });
}
