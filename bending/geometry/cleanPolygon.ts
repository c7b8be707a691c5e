import { SAME_POINT_MM } from "../core/tolerance";
import type { Vec2 } from "./vec2";

/**
 * The same region without repeated points, points in the middle of straight edges and spikes without area
 * (each within `tolerance`). An empty list when nothing with area is left.
 */
export function cleanPolygon(polygon: readonly Vec2[], tolerance = SAME_POINT_MM): readonly Vec2[] {
  const points = [...polygon];
  for (let i = 0, calm = 0; points.length > 2 && calm < points.length; ) {
    const n = points.length;
    const p = points[(i + n - 1) % n];
    const q = points[i % n];
    const r = points[(i + 1) % n];
    if (p && q && r && standsOff(p, q, r) <= tolerance) {
      points.splice(i % n, 1);
      i = Math.max(0, (i % n) - 1);
      calm = 0;
    } else {
      i = (i + 1) % n;
      calm++;
    }
  }
  return points.length > 2 ? points : [];
}

/** How far q stands off the line p-r, or off the nearer of p and r when it is a spike or a repeated point. */
function standsOff(p: Vec2, q: Vec2, r: Vec2): number {
  const toP = Math.hypot(q[0] - p[0], q[1] - p[1]);
  const toR = Math.hypot(q[0] - r[0], q[1] - r[1]);
  const base = Math.hypot(r[0] - p[0], r[1] - p[1]);
  const longest = Math.max(toP, toR, base);
  if (longest === 0) return 0;
  const twiceArea = Math.abs((q[0] - p[0]) * (r[1] - p[1]) - (q[1] - p[1]) * (r[0] - p[0]));
  return Math.min(toP, toR, twiceArea / longest);
}
