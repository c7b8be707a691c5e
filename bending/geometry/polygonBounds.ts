import type { Vec2 } from "./vec2";

export interface Bounds2 {
  readonly min: Vec2;
  readonly max: Vec2;
}

/** The smallest upright rectangle round the points; of no points, an empty one (min above max). */
export function polygonBounds(points: readonly Vec2[]): Bounds2 {
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) {
    minX = Math.min(minX, x);
    minY = Math.min(minY, y);
    maxX = Math.max(maxX, x);
    maxY = Math.max(maxY, y);
  }
  return { min: [minX, minY], max: [maxX, maxY] };
}
