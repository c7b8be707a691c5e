import type { Vec2 } from "../geometry/vec2";

/** The convex hull, counter-clockwise (Andrew's monotone chain, 1979). */
export function convexHull(points: readonly Vec2[]): readonly Vec2[] {
  const sorted = [...points].sort((p, q) => p[0] - q[0] || p[1] - q[1]);
  const chain = (run: readonly Vec2[]): Vec2[] => {
    const hull: Vec2[] = [];
    for (const p of run) {
      for (let a = hull[hull.length - 2], b = hull[hull.length - 1]; a && b; a = hull[hull.length - 2], b = hull[hull.length - 1]) {
        if ((b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]) > 0) break;
        hull.pop();
      }
      hull.push(p);
    }
    hull.pop();
    return hull;
  };
  return [...chain(sorted), ...chain([...sorted].reverse())];
}
