import { SAME_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { fitArcs, type FittedEdge } from "./fitArcs";
import type { Curve } from "./placedShape";
import { splinePoint } from "./splinePoint";

/** An arc of more than this is drawn as two, so that no bulge grows beyond bounds. */
const WIDEST = Math.PI * 1.01;

/** A curve (mm) as straight edges and arcs; arcs of circles exactly, ellipses and splines within `tolerance`. */
export function curvePieces(curve: Curve, tolerance: number): readonly FittedEdge[] {
  switch (curve.kind) {
    case "LINE": return [{ from: curve.from, to: curve.to, bulge: 0 }];
    case "POLYLINE": {
      const { points, closed } = curve;
      return points.slice(0, closed ? points.length : -1).map(([x, y, bulge], i) => {
        const next = points[(i + 1) % points.length] ?? [x, y, 0];
        return { from: [x, y], to: [next[0], next[1]], bulge };
      });
    }
    case "CONIC": return conicPieces(curve, tolerance);
    case "SPLINE": {
      const spans = curve.knots.flatMap((knot, i) => (i >= curve.degree && i < curve.points.length && (curve.knots[i + 1] ?? knot) > knot ? [i] : []));
      return spans.flatMap((span) => fitArcs((t) => splinePoint(curve, span, t), curve.knots[span] ?? 0, curve.knots[span + 1] ?? 0, tolerance));
    }
  }
}

function conicPieces({ centre, u, v, start, sweep }: Curve & { kind: "CONIC" }, tolerance: number): readonly FittedEdge[] {
  const at = (t: number): Vec2 => [centre[0] + u[0] * Math.cos(t) + v[0] * Math.sin(t), centre[1] + u[1] * Math.cos(t) + v[1] * Math.sin(t)];
  const [long, short] = [Math.hypot(...u), Math.hypot(...v)];
  const round = Math.abs(long - short) <= SAME_POINT_MM && Math.abs(u[0] * v[0] + u[1] * v[1]) <= SAME_POINT_MM * Math.max(long, short);
  const count = round ? (sweep > WIDEST ? 2 : 1) : Math.max(1, Math.ceil(sweep / (Math.PI / 2) - 1e-9));
  const sense = u[0] * v[1] - u[1] * v[0] < 0 ? -1 : 1;
  const steps = Array.from({ length: count }, (_, i) => [start + (sweep * i) / count, start + (sweep * (i + 1)) / count] as const);
  // A full turn ends exactly where it began.
  const whole = Math.abs(sweep - 2 * Math.PI) < 1e-9;
  const pieces = steps.flatMap(([a, b]): readonly FittedEdge[] => (round ? [{ from: at(a), to: at(b), bulge: sense * Math.tan(sweep / count / 4) }] : fitArcs(at, a, b, tolerance)));
  return whole ? pieces.map((piece, i) => (i === pieces.length - 1 ? { ...piece, to: pieces[0]?.from ?? piece.to } : piece)) : pieces;
}
