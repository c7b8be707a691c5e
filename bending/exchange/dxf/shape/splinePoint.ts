import type { Vec2 } from "../../../geometry/vec2";
import type { Curve } from "./placedShape";

type Homogeneous = readonly [number, number, number];

/** A point of a B-spline at `t` within the knot span `span`, by de Boor's algorithm, weights as a third coordinate (C. de Boor 1972; from memory). */
export function splinePoint(spline: Curve & { kind: "SPLINE" }, span: number, t: number): Vec2 {
  const { degree, knots, points, weights } = spline;
  const knot = (i: number) => knots[i] ?? 0;
  const d = Array.from({ length: degree + 1 }, (_, j): Homogeneous => {
    const i = span - degree + j;
    const [x, y] = points[i] ?? [0, 0];
    const w = weights?.[i] ?? 1;
    return [x * w, y * w, w];
  });
  for (let r = 1; r <= degree; r++) {
    for (let j = degree; j >= r; j--) {
      const i = span - degree + j;
      const wide = knot(i + degree - r + 1) - knot(i);
      const share = wide === 0 ? 0 : (t - knot(i)) / wide;
      const [a, b]: readonly [Homogeneous, Homogeneous] = [d[j - 1] ?? [0, 0, 1], d[j] ?? [0, 0, 1]];
      d[j] = [a[0] + (b[0] - a[0]) * share, a[1] + (b[1] - a[1]) * share, a[2] + (b[2] - a[2]) * share];
    }
  }
  const [x, y, w] = d[degree] ?? [0, 0, 1];
  return [x / w, y / w];
}
