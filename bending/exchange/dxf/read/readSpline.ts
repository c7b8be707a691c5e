import type { Vec2 } from "../../../geometry/vec2";
import type { DxfShape } from "./dxfDrawing";
import type { EntityFields } from "./entityFields";
import { splineThroughPoints } from "./splineThroughPoints";

const MOST_DEGREE = 11;

/** A B-spline by knots and control points (weights if rational), or one given by the points that it runs through only. */
export function readSpline(fields: EntityFields): DxfShape | string {
  const degree = Math.trunc(fields.number(71, "the degree", 3));
  const knots = fields.numbers(40, "a knot");
  const points = pairs(fields.numbers(10, "a control point's x"), fields.numbers(20, "a control point's y"));
  const through = pairs(fields.numbers(11, "a fit point's x"), fields.numbers(21, "a fit point's y"));
  if (!points || !through) return "its points have more x than y, or more y than x";
  if (points.length === 0 && through.length >= 2) return splineThroughPoints(through);
  if (!(degree >= 1 && degree <= MOST_DEGREE)) return `the degree must lie from 1 to ${MOST_DEGREE}, not ${degree}`;
  if (points.length <= degree) return `a spline of degree ${degree} needs ${degree + 1} control points at least; there are ${points.length}`;
  if (knots.length !== points.length + degree + 1) return `${points.length + degree + 1} knots were expected for ${points.length} control points of degree ${degree}; there are ${knots.length}`;
  if (knots.some((knot, i) => i > 0 && knot < (knots[i - 1] ?? knot))) return "its knots must not fall";
  if (!((knots[points.length] ?? 0) > (knots[degree] ?? 0))) return "its knots span nothing";
  const weights = fields.numbers(41, "a weight");
  if (weights.length > 0 && (weights.length !== points.length || weights.some((weight) => !(weight > 0)))) return "each control point needs one weight over 0";
  return { kind: "SPLINE", degree, knots, points, weights: weights.length > 0 ? weights : null };
}

function pairs(xs: readonly number[], ys: readonly number[]): readonly Vec2[] | null {
  return xs.length === ys.length ? xs.map((x, i): Vec2 => [x, ys[i] ?? 0]) : null;
}
