import type { Vec2 } from "./vec2";

/** Area of a closed polygon: positive when its vertices run counter-clockwise. */
export function signedArea(polygon: readonly Vec2[]): number {
  let twice = 0;
  let previous = polygon[polygon.length - 1];
  for (const point of polygon) {
    if (previous) twice += previous[0] * point[1] - point[0] * previous[1];
    previous = point;
  }
  return twice / 2;
}
