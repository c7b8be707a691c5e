import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { dotProduct } from "../geometry/dotProduct";
import type { Frame } from "../geometry/frame";
import type { Vec3 } from "../geometry/vec3";
import { bendDirections } from "../part/bendDirections";
import type { PartModel } from "../part/partModel";
import { arcCentre } from "./arcCentre";
import { outsideReach } from "./outsideReach";
import type { DimensionEnd } from "./partDimension";

/**
 * How far along `direction` the end of a dimension lies in the part as bent. `frames` lay every face out as it stands
 * towards the dimension's face; `way` is +1 where the dimension ends, -1 where it begins.
 */
export function endPosition(drawn: PartModel, bent: PartModel, frames: readonly Frame[], end: DimensionEnd, direction: Vec3, way: 1 | -1): number {
  if (end.at === "point") {
    const frame = frames[end.face];
    invariant(frame, "a dimension ends at a face of the part");
    return dotProduct(direction, applyFrame(frame, end.point));
  }
  const [as, is] = [drawn.bends[end.bend], bent.bends[end.bend]];
  const frame = frames[end.at === "arc" ? is?.parent ?? -1 : end.face];
  invariant(as && is && frame, "a dimension ends at a bend of the part");
  if (end.at === "arc") return dotProduct(direction, applyFrame(frame, arcCentre(is, bent.thickness))) + way * (is.insideRadius + bent.thickness);
  const { outward } = bendDirections(is);
  const [sign, tangent] = end.face === is.parent ? [1, is.zone[0]] : [-1, is.zone[1]];
  const reach = outsideReach(as, is, bent.thickness) * sign;
  return dotProduct(direction, applyFrame(frame, [tangent[0] + outward[0] * reach, tangent[1] + outward[1] * reach, 0]));
}
