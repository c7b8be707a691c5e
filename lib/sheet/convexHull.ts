import type { Vec2 } from "@/bending/geometry/vec2";

/** Convex hull, counter-clockwise, without points on its edges (Andrew's monotone chain). */
export function convexHull(points: readonly Vec2[]): readonly Vec2[] {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  if (sorted.length < 3) return sorted;
  const lower = chain(sorted);
  const upper = chain(sorted.reverse());
  return [...lower.slice(0, -1), ...upper.slice(0, -1)];
}

function chain(points: readonly Vec2[]): Vec2[] {
  const kept: Vec2[] = [];
  for (const point of points) {
    while (kept.length >= 2) {
      const [a, b] = [kept[kept.length - 2], kept[kept.length - 1]];
      if (!a || !b || (b[0] - a[0]) * (point[1] - a[1]) - (b[1] - a[1]) * (point[0] - a[0]) > 1e-9) break;
      kept.pop();
    }
    kept.push(point);
  }
  return kept;
}
