import { polygonBounds, type Bounds2 } from "../../../geometry/polygonBounds";
import type { Vec2 } from "../../../geometry/vec2";
import { bulgeCentre } from "./bulgeCentre";

/** The smallest upright rectangle round a closed contour of [x, y, bulge], arcs exact. */
export function bulgedBounds(vertices: readonly (readonly [number, number, number])[]): Bounds2 {
  return polygonBounds(vertices.flatMap(([x, y, bulge], i): readonly Vec2[] => {
    const next = vertices[(i + 1) % vertices.length] ?? [x, y, 0];
    if (bulge === 0) return [[x, y]];
    const { centre, radius } = bulgeCentre([x, y], [next[0], next[1]], bulge);
    // On the arc are the points on the arc's own side of its chord.
    const side = (p: Vec2) => ((next[0] - x) * (p[1] - y) - (next[1] - y) * (p[0] - x)) * bulge;
    const extremes: readonly Vec2[] = [[centre[0] + radius, centre[1]], [centre[0] - radius, centre[1]], [centre[0], centre[1] + radius], [centre[0], centre[1] - radius]];
    return [[x, y], ...extremes.filter((p) => side(p) < 0)];
  }));
}
