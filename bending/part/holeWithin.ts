import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import { polygonContains } from "../geometry/polygonContains";
import { segmentsCross } from "../geometry/segmentsCross";
import type { Vec2 } from "../geometry/vec2";

/** Whether a hole lies wholly inside a face, without touching its outline. */
export function holeWithin(hole: readonly Vec2[], face: readonly Vec2[]): boolean {
  const [point] = hole;
  return point !== undefined && polygonContains(face, point) && !edgesCross(hole, face);
}

/** Whether two holes touch, cross or hold one another. */
export function holesMeet(a: readonly Vec2[], b: readonly Vec2[]): boolean {
  const [p, q] = [polygonBounds(a), polygonBounds(b)];
  if (p.max[0] < q.min[0] || q.max[0] < p.min[0] || p.max[1] < q.min[1] || q.max[1] < p.min[1]) return false;
  return edgesCross(a, b) || (b[0] !== undefined && polygonContains(a, b[0])) || (a[0] !== undefined && polygonContains(b, a[0]));
}

/** Whether an edge of `a` meets an edge of `b`; only what reaches into both their bounds is looked at. */
function edgesCross(a: readonly Vec2[], b: readonly Vec2[]): boolean {
  const [p, q] = [polygonBounds(a), polygonBounds(b)];
  const common: Bounds2 = { min: [Math.max(p.min[0], q.min[0]), Math.max(p.min[1], q.min[1])], max: [Math.min(p.max[0], q.max[0]), Math.min(p.max[1], q.max[1])] };
  const near = edgesWithin(b, common);
  return near.length > 0 && edgesWithin(a, common).some(([from, to]) => near.some(([r, s]) => segmentsCross(from, to, r, s) !== null));
}

function edgesWithin(polygon: readonly Vec2[], { min, max }: Bounds2): readonly (readonly [Vec2, Vec2])[] {
  const edges: (readonly [Vec2, Vec2])[] = [];
  polygon.forEach((p, i) => {
    const q = polygon[(i + 1) % polygon.length] ?? p;
    if (Math.max(p[0], q[0]) < min[0] || Math.min(p[0], q[0]) > max[0] || Math.max(p[1], q[1]) < min[1] || Math.min(p[1], q[1]) > max[1]) return;
    edges.push([p, q]);
  });
  return edges;
}
