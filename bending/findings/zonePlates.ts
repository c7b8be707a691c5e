import { facetCount } from "../clearance/facetCount";
import { EMPTY_AREA_MM2 } from "../core/tolerance";
import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import { convexPieces } from "../geometry/convexPieces";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import type { Vec3 } from "../geometry/vec3";
import { bendDirections } from "../part/bendDirections";
import { bendFacets, type FacetQuad } from "../part/bendFacets";
import type { PartModel } from "../part/partModel";

/** One plate of a formed bend: as many corners on the outside as on the inside. */
export interface ZonePlate {
  readonly outside: readonly Vec3[];
  readonly inside: readonly Vec3[];
}

/** A finished bend as convex plates where its parent lies; of a zone that is notched, what is left of it. */
export function zonePlates(part: PartModel, index: number): readonly ZonePlate[] {
  const bend = part.bends[index];
  if (!bend) return [];
  const facets = bendFacets(part, index, bend.angle, facetCount(part, bend, bend.angle));
  if (bend.region === null) return facets;
  const { along, outward } = bendDirections(bend);
  const [parentStart, , , parentEnd] = bend.zone;
  const length = (parentEnd[0] - parentStart[0]) * along[0] + (parentEnd[1] - parentStart[1]) * along[1];
  const step = bend.allowance / facets.length;
  const pieces = bend.region.flatMap((region) => convexPieces(region.outline, region.holes));
  return facets.flatMap(({ outside, inside }, i) => pieces.flatMap((piece): readonly ZonePlate[] => {
    const at = (u: number): Vec2 => [parentStart[0] + outward[0] * u, parentStart[1] + outward[1] * u];
    const strip = clipByHalfPlane(clipByHalfPlane(piece, at(i * step), outward), at((i + 1) * step), [-outward[0], -outward[1]]);
    if (strip.length < 3 || signedArea(strip) < EMPTY_AREA_MM2) return [];
    const shares = strip.map(([x, y]): Vec2 => {
      const [dx, dy] = [x - parentStart[0], y - parentStart[1]];
      return [(dx * along[0] + dy * along[1]) / length, (dx * outward[0] + dy * outward[1]) / step - i];
    });
    return [{ outside: shares.map((share) => onQuad(outside, share)), inside: shares.map((share) => onQuad(inside, share)) }];
  }));
}

/** A point of a facet's side: shares of the way along the bend and from the parent's side to the child's. */
function onQuad([parentStart, childStart, childEnd, parentEnd]: FacetQuad, [s, f]: Vec2): Vec3 {
  const mix = (axis: 0 | 1 | 2) => (parentStart[axis] * (1 - s) + parentEnd[axis] * s) * (1 - f) + (childStart[axis] * (1 - s) + childEnd[axis] * s) * f;
  return [mix(0), mix(1), mix(2)];
}
