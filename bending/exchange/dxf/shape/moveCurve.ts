import type { Vec2 } from "../../../geometry/vec2";
import type { BulgedPoint } from "../read/dxfDrawing";
import { applyAffine, keepsCircles, turnByAffine, type Affine } from "./affine";
import type { Curve } from "./placedShape";

/** Curves under an affine map; a polyline whose arcs become arcs of ellipses falls apart into its edges. */
export function moveCurve(curve: Curve, m: Affine): readonly Curve[] {
  switch (curve.kind) {
    case "LINE": return [{ kind: "LINE", from: applyAffine(m, curve.from), to: applyAffine(m, curve.to) }];
    case "CONIC": return [{ ...curve, centre: applyAffine(m, curve.centre), u: turnByAffine(m, curve.u), v: turnByAffine(m, curve.v) }];
    case "SPLINE": return [{ ...curve, points: curve.points.map((p) => applyAffine(m, p)) }];
    case "POLYLINE": {
      if (!keepsCircles(m) && curve.points.some(([, , bulge]) => bulge !== 0)) return edgesOf(curve.points, curve.closed).flatMap((edge) => moveCurve(edge, m));
      const sense = m[0] * m[3] - m[1] * m[2] < 0 ? -1 : 1;
      return [{ ...curve, points: curve.points.map(([x, y, bulge]): BulgedPoint => { const p = applyAffine(m, [x, y]); return [p[0], p[1], bulge * sense]; }) }];
    }
  }
}

function edgesOf(points: readonly BulgedPoint[], closed: boolean): readonly Curve[] {
  return points.slice(0, closed ? points.length : -1).map(([x, y, bulge], i): Curve => {
    const next = points[(i + 1) % points.length] ?? points[0] ?? [0, 0, 0];
    const [from, to]: readonly [Vec2, Vec2] = [[x, y], [next[0], next[1]]];
    return bulge === 0 ? { kind: "LINE", from, to } : conicOfBulge(from, to, bulge);
  });
}

function conicOfBulge(from: Vec2, to: Vec2, bulge: number): Curve {
  const sweep = 4 * Math.atan(bulge);
  const toCentre = 0.5 / Math.tan(sweep / 2);
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const centre: Vec2 = [(from[0] + to[0]) / 2 - dy * toCentre, (from[1] + to[1]) / 2 + dx * toCentre];
  const u: Vec2 = [from[0] - centre[0], from[1] - centre[1]];
  const sign = Math.sign(sweep);
  return { kind: "CONIC", centre, u, v: [-u[1] * sign, u[0] * sign], start: 0, sweep: Math.abs(sweep) };
}
