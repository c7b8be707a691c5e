import type { FlatPoint } from "../geometry/vec2";
import { widened } from "./widened";

/**
 * An outline that ends earlier along the stretch `a` to `b` of one of its edges: there only from `a2` to `b2`, which lie inside.
 * Null when no edge runs so.
 */
export function narrowed(outline: readonly FlatPoint[], a: FlatPoint, b: FlatPoint, a2: FlatPoint, b2: FlatPoint): readonly FlatPoint[] | null {
  let points = widened(outline, a, b, a2, b2);
  if (points === null) return null;
  for (let spike = spikeOf(points); spike >= 0; spike = spikeOf(points)) points = points.filter((_, i) => i !== spike);
  return points;
}

/** A corner where the outline turns right back on itself; -1 when there is none. */
function spikeOf(points: readonly FlatPoint[]): number {
  return points.findIndex((p, i) => {
    const before = points[(i + points.length - 1) % points.length] ?? p;
    const after = points[(i + 1) % points.length] ?? p;
    const [ax, ay, bx, by] = [p[0] - before[0], p[1] - before[1], after[0] - p[0], after[1] - p[1]];
    const [cross, dot] = [ax * by - ay * bx, ax * bx + ay * by];
    return dot <= 0 && Math.abs(cross) <= 1e-9 * (1 + Math.hypot(ax, ay) * Math.hypot(bx, by));
  });
}
