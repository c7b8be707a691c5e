import type { Vec2 } from "./vec2";

const cross = (o: Vec2, a: Vec2, b: Vec2) => (a[0] - o[0]) * (b[1] - o[1]) - (a[1] - o[1]) * (b[0] - o[0]);

/**
 * Where two segments meet, ends counted, or null. When they lie on one line and overlap, the answer is a
 * point of the overlap.
 */
export function segmentsCross(a: Vec2, b: Vec2, c: Vec2, d: Vec2): Vec2 | null {
  const d1 = cross(c, d, a);
  const d2 = cross(c, d, b);
  const d3 = cross(a, b, c);
  const d4 = cross(a, b, d);
  if (d1 * d2 < 0 && d3 * d4 < 0) {
    const t = d1 / (d1 - d2);
    return [a[0] + t * (b[0] - a[0]), a[1] + t * (b[1] - a[1])];
  }
  const within = (p: Vec2, q: Vec2, r: Vec2) =>
    Math.min(p[0], q[0]) <= r[0] && r[0] <= Math.max(p[0], q[0]) && Math.min(p[1], q[1]) <= r[1] && r[1] <= Math.max(p[1], q[1]);
  if (d1 === 0 && within(c, d, a)) return a;
  if (d2 === 0 && within(c, d, b)) return b;
  if (d3 === 0 && within(a, b, c)) return c;
  if (d4 === 0 && within(a, b, d)) return d;
  return null;
}
