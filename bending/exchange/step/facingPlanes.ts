import { SOLID_MATCH_MM, SOLID_PARALLEL_RAD } from "../../core/tolerance";
import { difference } from "../../geometry/difference";
import { dotProduct } from "../../geometry/dotProduct";
import { polygonBounds, type Bounds2 } from "../../geometry/polygonBounds";
import type { Vec2 } from "../../geometry/vec2";
import { flattenLoop } from "./flattenLoop";
import { planeAxes } from "./planeAxes";
import type { Solid } from "./solid";

/** Two plane faces back to back with material between: the two sides of a sheet, if the sheet is that thick. */
export interface FacingPlanes {
  readonly a: number;
  readonly b: number;
  readonly distance: number;
  /** 0..1: how far they cover one another, by their bounding rectangles. */
  readonly cover: number;
  readonly area: number;
}

/** Part of their rectangles that two sides of a sheet have in common at the least; mitred rims cover a little less than all. */
const LEAST_COVER = 0.3;
/** Faces of the solid that are compared one by one; larger ones first, so that nothing of weight is left. */
const MOST_PLANES = 1_500;

export function facingPlanes(solid: Solid): readonly FacingPlanes[] {
  const planes = solid.faces
    .flatMap(({ surface, area }, face) => (surface.kind === "plane" ? [{ face, area, ...surface }] : []))
    .sort((p, q) => q.area - p.area).slice(0, MOST_PLANES);
  const found: FacingPlanes[] = [];
  planes.forEach((p, i) => {
    let rectangle: Bounds2 | null = null;
    for (const q of planes.slice(i + 1)) {
      if (dotProduct(p.normal, q.normal) > -Math.cos(SOLID_PARALLEL_RAD)) continue;
      const distance = dotProduct(difference(p.point, q.point), p.normal);
      if (distance <= SOLID_MATCH_MM) continue;
      const axes = planeAxes(p.normal, p.point);
      const corners = (face: number): readonly Vec2[] =>
        (solid.faces[face]?.loops ?? []).flatMap((loop) => flattenLoop(solid, loop, axes).vertices.map(([x, y]): Vec2 => [x, y]));
      rectangle ??= polygonBounds(corners(p.face));
      const cover = commonPart(rectangle, polygonBounds(corners(q.face)));
      if (cover >= LEAST_COVER) found.push({ a: p.face, b: q.face, distance, cover, area: Math.min(p.area, q.area) });
    }
  });
  return found;
}

/** Common area of two rectangles as a part of what they cover together. */
function commonPart(a: Bounds2, b: Bounds2): number {
  const size = ({ min, max }: Bounds2) => Math.max(0, max[0] - min[0]) * Math.max(0, max[1] - min[1]);
  const common = size({
    min: [Math.max(a.min[0], b.min[0]), Math.max(a.min[1], b.min[1])],
    max: [Math.min(a.max[0], b.max[0]), Math.min(a.max[1], b.max[1])],
  });
  return common / Math.max(size(a) + size(b) - common, Number.MIN_VALUE);
}
