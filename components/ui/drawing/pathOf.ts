import type { Vec2 } from "@/bending/geometry/vec2";

/** SVG path data of polygons (closed) on the sheet. */
export function pathOf(polygons: readonly (readonly Vec2[])[], at: (point: Vec2) => Vec2 = (point) => point): string {
  return polygons.map((polygon) => `${polygon.map((point, i) => {
    const [x, y] = at(point);
    return `${i === 0 ? "M" : "L"}${x.toFixed(2)} ${y.toFixed(2)}`;
  }).join("")}Z`).join("");
}
