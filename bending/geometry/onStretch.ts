import type { Vec2 } from "./vec2";

/** Does the point lie on the stretch from `a` to `b`, at most `within` mm beside it or beyond its ends? Never when the stretch is shorter than that. */
export function onStretch(a: Vec2, b: Vec2, point: Vec2, within: number): boolean {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (length < within) return false;
  const along = ((point[0] - a[0]) * (b[0] - a[0]) + (point[1] - a[1]) * (b[1] - a[1])) / length;
  const off = ((b[0] - a[0]) * (point[1] - a[1]) - (b[1] - a[1]) * (point[0] - a[0])) / length;
  return Math.abs(off) < within && along > -within && along < length + within;
}
