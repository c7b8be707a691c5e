import type { Vec2 } from "../../../geometry/vec2";

/**
 * Bulge of the arc from p through q to r. By the inscribed angle (Euclid III.20) the arc turns through twice what is missing to half a
 * turn at q; a point on the right of the chord makes it counter-clockwise.
 */
export function bulgeThrough(p: Vec2, q: Vec2, r: Vec2): number {
  const [ax, ay, bx, by] = [p[0] - q[0], p[1] - q[1], r[0] - q[0], r[1] - q[1]];
  const atQ = Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
  if (atQ === 0) return 0;
  // Positive when q lies on the left of p -> r.
  const left = (r[0] - p[0]) * (q[1] - p[1]) - (r[1] - p[1]) * (q[0] - p[0]);
  const bulge = Math.tan((Math.PI - Math.abs(atQ)) / 2);
  return left > 0 ? -bulge : bulge;
}
