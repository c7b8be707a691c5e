import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";
import { onEdge, type EdgeAxes } from "./edgeCut";

/** Rounding of a strip's depth through a polygon clip; far under anything drawn (mm). */
const ON_LINE_MM = 1e-5;

/**
 * Where along a drawn edge the plane face really begins, at the depth of the bend: the longest straight run
 * within `wanted`, or null.
 */
export function edgeRange(plane: readonly Vec2[], axes: EdgeAxes, depth: number, wanted: Interval): Interval | null {
  let best: Interval | null = null;
  plane.forEach((p, i) => {
    const q = plane[(i + 1) % plane.length] ?? p;
    const [[a, ha], [b, hb]] = [onEdge(axes, p), onEdge(axes, q)];
    if (Math.abs(ha - depth) > ON_LINE_MM || Math.abs(hb - depth) > ON_LINE_MM) return;
    const [from, to] = [Math.max(a, wanted[0]), Math.min(b, wanted[1])];
    if (to > from && (!best || to - from > best[1] - best[0])) best = [from, to];
  });
  return best;
}
