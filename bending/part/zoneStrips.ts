import { invariant } from "../core/invariant";
import { EMPTY_AREA_MM2 } from "../core/tolerance";
import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import { convexPieces } from "../geometry/convexPieces";
import { signedArea } from "../geometry/signedArea";
import type { FlatPoint, Vec2 } from "../geometry/vec2";
import { bendDirections } from "./bendDirections";
import type { FlatRegion, PartModel } from "./partModel";

/**
 * A bend zone as convex pieces of sheet in `count` strips along the bend, in the unfolded sheet: mapped by `foldZonePoint` they make the
 * bent shape with its holes and notches, each strip a flat facet. `regions` are the bend's own out of `sheetRegions`.
 */
export function zoneStrips(part: PartModel, bendIndex: number, regions: readonly FlatRegion[], count: number): readonly (readonly FlatPoint[])[] {
  const bend = part.bends[bendIndex];
  invariant(bend && count >= 1, "zoneStrips: a bend of the part and at least one strip");
  const { outward } = bendDirections(bend);
  const inward: Vec2 = [-outward[0], -outward[1]];
  const [start] = bend.zone;
  const across = (share: number): Vec2 => [start[0] + outward[0] * bend.allowance * share, start[1] + outward[1] * bend.allowance * share];
  const pieces = regions.flatMap(({ outline, holes }) => convexPieces(outline, holes));
  return Array.from({ length: count }, (_, i) => pieces.map((piece) =>
    clipByHalfPlane(clipByHalfPlane(piece, across(i / count), outward), across((i + 1) / count), inward)))
    .flat()
    .filter((piece) => piece.length > 2 && signedArea(piece) > EMPTY_AREA_MM2);
}
