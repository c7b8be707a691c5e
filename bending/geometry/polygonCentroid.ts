import { EMPTY_AREA_MM2 } from "../core/tolerance";
import type { Vec2 } from "./vec2";

/** Centre of area; for a polygon without area, the mean of its vertices. */
export function polygonCentroid(polygon: readonly Vec2[]): Vec2 {
  const origin = polygon[0] ?? [0, 0];
  let twice = 0;
  let x = 0;
  let y = 0;
  polygon.forEach((p, i) => {
    const q = polygon[(i + 1) % polygon.length] ?? p;
    const [px, py, qx, qy] = [p[0] - origin[0], p[1] - origin[1], q[0] - origin[0], q[1] - origin[1]];
    const cross = px * qy - qx * py;
    twice += cross;
    x += (px + qx) * cross;
    y += (py + qy) * cross;
  });
  if (Math.abs(twice) > EMPTY_AREA_MM2) return [origin[0] + x / (3 * twice), origin[1] + y / (3 * twice)];
  const n = Math.max(1, polygon.length);
  return [polygon.reduce((sum, p) => sum + p[0], 0) / n, polygon.reduce((sum, p) => sum + p[1], 0) / n];
}
