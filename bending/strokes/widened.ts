import { SAME_POINT_MM } from "../core/tolerance";
import { onStretch } from "../geometry/onStretch";
import type { FlatPoint } from "../geometry/vec2";

/** mm. How far the ends of a bend zone may lie off the edge of the face that they belong to. */
const ON_EDGE_MM = 1000 * SAME_POINT_MM;

/**
 * A counter-clockwise outline that is carried on over one of its edges: from the stretch `a` to `b` of that edge out to `a2` to `b2`.
 * Null when no edge runs so.
 */
export function widened(outline: readonly FlatPoint[], a: FlatPoint, b: FlatPoint, a2: FlatPoint, b2: FlatPoint): readonly FlatPoint[] | null {
  const edge = outline.findIndex((p, i) => {
    const q = outline[(i + 1) % outline.length] ?? p;
    return onStretch(p, q, a, ON_EDGE_MM) && onStretch(p, q, b, ON_EDGE_MM) && (b[0] - a[0]) * (q[0] - p[0]) + (b[1] - a[1]) * (q[1] - p[1]) > 0;
  });
  if (edge < 0) return null;
  const added = [a, a2, b2, b];
  const all = [...outline.slice(0, edge + 1), ...added, ...outline.slice(edge + 1)];
  return all.filter((p, i) => apart(p, all[(i + 1) % all.length] ?? p));
}

const apart = (p: FlatPoint, q: FlatPoint): boolean => Math.hypot(p[0] - q[0], p[1] - q[1]) > SAME_POINT_MM;
