import { applyFrame } from "../geometry/applyFrame";
import { convexHull } from "../geometry/convexHull";
import type { Frame } from "../geometry/frame";
import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";
import type { Hit } from "../clearance/hit";
import { bendFacets } from "../part/bendFacets";
import type { PartModel } from "../part/partModel";

/** A convex piece of a bend zone: what it covers seen along the bed, and from where to where. */
export interface ZonePiece {
  readonly outline: readonly Vec2[];
  readonly z: Interval;
}

const FACETS_OF_A_FORMED_BEND = 4;
/** A finger may rest on the fold of a hem: finer, so that it touches where the fold really is. */
export const FACETS_OF_A_FOLD = 24;

/** Every bend zone before the stroke, as convex pieces seen along the bed; a little large, never small. */
export function zonesInMachine(part: PartModel, hit: Hit, frames: readonly Frame[]): readonly ZonePiece[] {
  return part.bends.flatMap((bend, index) => {
    const frame = frames[bend.parent];
    if (frame === undefined) return [];
    const formed = (hit.formed >> index) & 1;
    const facets = bendFacets(part, index, formed ? bend.angle : 0, formed ? (bend.hem === null ? FACETS_OF_A_FORMED_BEND : FACETS_OF_A_FOLD) : 1);
    return facets.map(({ inside, outside }): ZonePiece => {
      const points = [...inside, ...outside].map((p) => applyFrame(frame, p));
      const zs = points.map((p) => p[2]);
      return { outline: convexHull(points.map((p): Vec2 => [p[0], p[1]])), z: [Math.min(...zs), Math.max(...zs)] };
    });
  });
}
