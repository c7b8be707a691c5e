import { invariant } from "../core/invariant";
import type { Vec3 } from "../geometry/vec3";
import { bendDirections } from "../part/bendDirections";
import type { Bend, PartModel } from "../part/partModel";
import { arcCentre } from "./arcCentre";
import { outsideReach } from "./outsideReach";
import type { DimensionEnd } from "./partDimension";

/** Where a dimension ends: a point of a face's sheet, and how much farther out than that, whatever the direction. */
export interface EndPoint {
  readonly face: number;
  readonly point: Vec3;
  readonly beyond: number;
}

/** The end of a dimension when its own bend, if it has one, comes out as `bent`. */
export function endPoint(part: PartModel, end: DimensionEnd, bent: Bend | null): EndPoint {
  if (end.at === "point") return { face: end.face, point: end.point, beyond: 0 };
  const drawn = part.bends[end.bend];
  const is = bent ?? drawn;
  invariant(drawn && is, "a dimension ends at a bend of the part");
  if (end.at === "arc") return { face: is.parent, point: arcCentre(is, part.thickness), beyond: is.insideRadius + part.thickness };
  const { outward } = bendDirections(is);
  const [sign, tangent] = end.face === is.parent ? [1, is.zone[0]] : [-1, is.zone[1]];
  const reach = outsideReach(drawn, is, part.thickness) * sign;
  return { face: end.face, point: [tangent[0] + outward[0] * reach, tangent[1] + outward[1] * reach, 0], beyond: 0 };
}
