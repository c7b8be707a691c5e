import type { Vec2 } from "./vec2";

/**
 * How deep two convex polygons (counter-clockwise) overlap: the least way that would part them, 0 when they
 * only touch or stand apart (separating axis theorem).
 */
export function convexOverlap(a: readonly Vec2[], b: readonly Vec2[]): number {
  return Math.max(0, Math.min(leastDepth(a, b), leastDepth(b, a)));
}

function leastDepth(a: readonly Vec2[], b: readonly Vec2[]): number {
  let least = Infinity;
  a.forEach((p, i) => {
    const q = a[(i + 1) % a.length] ?? p;
    const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
    if (length === 0) return;
    const [nx, ny] = [(q[1] - p[1]) / length, (p[0] - q[0]) / length];
    let deepest = -Infinity;
    for (const r of b) deepest = Math.max(deepest, -((r[0] - p[0]) * nx + (r[1] - p[1]) * ny));
    least = Math.min(least, deepest);
  });
  return least;
}
