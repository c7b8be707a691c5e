import type { Vec2 } from "../../../geometry/vec2";
import type { DxfShape } from "./dxfDrawing";

/**
 * A smooth curve through the points, as a cubic B-spline of joined Bézier pieces: tangents by the cardinal rule with half the
 * distance of the neighbours (Catmull and Rom 1974; from memory). What a program drew between its fit points is not in the file.
 */
export function splineThroughPoints(points: readonly Vec2[]): DxfShape {
  const n = points.length;
  const at = (i: number): Vec2 => points[Math.min(n - 1, Math.max(0, i))] ?? [0, 0];
  const tangent = (i: number): Vec2 => {
    const [a, b] = [at(i - 1), at(i + 1)];
    const share = i === 0 || i === n - 1 ? 1 : 0.5;
    return [(b[0] - a[0]) * share, (b[1] - a[1]) * share];
  };
  const control: Vec2[] = [at(0)];
  const knots = [0, 0, 0, 0];
  for (let i = 0; i + 1 < n; i++) {
    const [p, q, s, t] = [at(i), at(i + 1), tangent(i), tangent(i + 1)];
    control.push([p[0] + s[0] / 3, p[1] + s[1] / 3], [q[0] - t[0] / 3, q[1] - t[1] / 3], q);
    knots.push(i + 1, i + 1, i + 1);
  }
  return { kind: "SPLINE", degree: 3, knots: [...knots, n - 1], points: control, weights: null };
}
