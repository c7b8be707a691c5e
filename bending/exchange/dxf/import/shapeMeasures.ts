import type { Vec2 } from "../../../geometry/vec2";
import type { PlacedShape } from "../shape/placedShape";

/** Points that span the shapes, and the radii of their arcs and circles, in drawing units. */
export function shapeMeasures(shapes: readonly PlacedShape[]): { readonly points: readonly Vec2[]; readonly radii: readonly number[] } {
  const points: Vec2[] = [];
  const radii: number[] = [];
  for (const { curve } of shapes) {
    switch (curve.kind) {
      case "LINE": points.push(curve.from, curve.to); break;
      case "SPLINE": points.push(...curve.points); break;
      case "CONIC": {
        const at = (t: number): Vec2 => [curve.centre[0] + curve.u[0] * Math.cos(t) + curve.v[0] * Math.sin(t), curve.centre[1] + curve.u[1] * Math.cos(t) + curve.v[1] * Math.sin(t)];
        for (let i = 0; i <= 8; i++) points.push(at(curve.start + (curve.sweep * i) / 8));
        radii.push(Math.hypot(...curve.u));
        break;
      }
      case "POLYLINE":
        curve.points.forEach(([x, y, bulge], i) => {
          points.push([x, y]);
          const next = curve.points[i + 1] ?? curve.points[0];
          if (bulge !== 0 && next) radii.push(Math.hypot(next[0] - x, next[1] - y) / (2 * Math.abs(Math.sin(2 * Math.atan(bulge)))));
        });
        break;
    }
  }
  return { points, radii };
}
