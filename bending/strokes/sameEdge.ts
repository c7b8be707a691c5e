import type { FlatPoint } from "../geometry/vec2";

/** The edge of an outline that shares most with edge `edge` of another outline of the same sheet; `edge` itself where none does. */
export function sameEdge(from: readonly FlatPoint[], edge: number, to: readonly FlatPoint[]): number {
  const [p, q] = [from[edge], from[(edge + 1) % Math.max(1, from.length)]];
  if (p === undefined || q === undefined) return edge;
  let [best, most] = [edge, 0];
  to.forEach((a, i) => {
    const shared = overlap(p, q, a, to[(i + 1) % to.length] ?? a);
    if (shared > most + 1e-9) [best, most] = [i, shared];
  });
  return best;
}

/** mm that two stretches on one line share, 0 when they lie on different lines. */
function overlap(p: FlatPoint, q: FlatPoint, a: FlatPoint, b: FlatPoint): number {
  const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
  if (length === 0) return 0;
  const [ux, uy] = [(q[0] - p[0]) / length, (q[1] - p[1]) / length];
  const off = (r: FlatPoint) => Math.abs((r[0] - p[0]) * uy - (r[1] - p[1]) * ux);
  if (off(a) > 1e-3 || off(b) > 1e-3) return 0;
  const along = (r: FlatPoint) => (r[0] - p[0]) * ux + (r[1] - p[1]) * uy;
  return Math.max(0, Math.min(length, Math.max(along(a), along(b))) - Math.max(0, Math.min(along(a), along(b))));
}
