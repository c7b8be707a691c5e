import type { Vec2 } from "./vec2";

/** Whether the point is inside (even-odd rule). On the boundary the answer may be either. */
export function polygonContains(polygon: readonly Vec2[], point: Vec2): boolean {
  let inside = false;
  let previous = polygon[polygon.length - 1];
  for (const current of polygon) {
    if (previous && current[1] > point[1] !== previous[1] > point[1]) {
      const x = previous[0] + ((point[1] - previous[1]) / (current[1] - previous[1])) * (current[0] - previous[0]);
      if (point[0] < x) inside = !inside;
    }
    previous = current;
  }
  return inside;
}
