import type { Vec2 } from "./vec2";

/** The convex hull, counter-clockwise, without points on its sides (monotone chain, Andrew 1979). */
export function convexHull(points: readonly Vec2[]): readonly Vec2[] {
  const sorted = [...points].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  if (sorted.length < 3) return sorted;
  const lower = chain(sorted);
  const upper = chain(sorted.reverse());
  return [...lower.slice(0, -1), ...upper.slice(0, -1)];
}

function chain(sorted: readonly Vec2[]): readonly Vec2[] {
  const kept: Vec2[] = [];
  for (const p of sorted) {
    while (kept.length >= 2) {
      const [a, b] = [kept[kept.length - 2], kept[kept.length - 1]];
      if (!a || !b || (b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]) > 0) break;
      kept.pop();
    }
    kept.push(p);
  }
  return kept;
}
