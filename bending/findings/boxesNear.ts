import type { Bounds2 } from "../geometry/polygonBounds";

/** Do two upright rectangles come within a distance of one another? */
export function boxesNear(a: Bounds2, b: Bounds2, within: number): boolean {
  return a.min[0] - within <= b.max[0] && b.min[0] - within <= a.max[0] && a.min[1] - within <= b.max[1] && b.min[1] - within <= a.max[1];
}
