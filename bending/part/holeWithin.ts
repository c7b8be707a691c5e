import { polygonBounds } from "../geometry/polygonBounds";
import { polygonContains } from "../geometry/polygonContains";
import { segmentsCross } from "../geometry/segmentsCross";
import type { Vec2 } from "../geometry/vec2";

/** Whether a hole lies wholly inside a face, without touching its outline. */
export function holeWithin(hole: readonly Vec2[], face: readonly Vec2[]): boolean {
  return hole.every((p) => polygonContains(face, p)) && !edgesCross(hole, face);
}

/** Whether two holes touch, cross or hold one another. */
export function holesMeet(a: readonly Vec2[], b: readonly Vec2[]): boolean {
  const [p, q] = [polygonBounds(a), polygonBounds(b)];
  if (p.max[0] < q.min[0] || q.max[0] < p.min[0] || p.max[1] < q.min[1] || q.max[1] < p.min[1]) return false;
  return edgesCross(a, b) || (b[0] !== undefined && polygonContains(a, b[0])) || (a[0] !== undefined && polygonContains(b, a[0]));
}

function edgesCross(a: readonly Vec2[], b: readonly Vec2[]): boolean {
  return a.some((p, i) => {
    const q = a[(i + 1) % a.length] ?? p;
    return b.some((r, j) => segmentsCross(p, q, r, b[(j + 1) % b.length] ?? r) !== null);
  });
}
