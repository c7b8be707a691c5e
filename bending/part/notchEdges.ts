import { SAME_POINT_MM } from "../core/tolerance";
import { selfCrossing } from "../geometry/selfCrossing";
import type { Vec2 } from "../geometry/vec2";
import type { CutWithEnds } from "./cutEnds";
import { fromEdge, onEdge } from "./edgeCut";

/**
 * Cuts the strips of flanges that stand clear of both ends of their edges, without a general polygon clip:
 * each notch replaces a stretch of its edge. Null when that is not the whole story (a notch that meets a corner, another
 * notch or a round relief).
 */
export function notchEdges(plane: readonly Vec2[], cuts: readonly CutWithEnds[]): readonly Vec2[] | null {
  let points = plane;
  for (const { cut, axes, start, end } of cuts) {
    if (cut.relief?.kind === "round" || start.relief !== end.relief) return null;
    const [from, to] = [start.at, end.at];
    const relief = cut.relief?.kind === "rectangular" && start.relief > 0 ? cut.relief : null;
    const [width, deep] = relief ? [start.relief, Math.max(relief.depth, cut.depth)] : [0, cut.depth];
    if (to - from <= SAME_POINT_MM || cut.depth <= 0) return null;
    const local = points.map((p) => onEdge(axes, p));
    const at = local.findIndex(([a, h], i) => {
      const [b, g] = local[(i + 1) % local.length] ?? [0, 0];
      return Math.abs(h) < SAME_POINT_MM && Math.abs(g) < SAME_POINT_MM && a < from - width - SAME_POINT_MM && b > to + width + SAME_POINT_MM;
    });
    if (at < 0) return null;
    const notch: readonly Vec2[] = relief && deep > cut.depth
      ? [[from - width, 0], [from - width, deep], [from, deep], [from, cut.depth], [to, cut.depth], [to, deep], [to + width, deep], [to + width, 0]]
      : [[from - width, 0], [from - width, deep], [to + width, deep], [to + width, 0]];
    points = [...points.slice(0, at + 1), ...notch.map((p) => fromEdge(axes, p)), ...points.slice(at + 1)];
  }
  return selfCrossing(points) ? null : points;
}
