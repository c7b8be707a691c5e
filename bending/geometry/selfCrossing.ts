import { segmentsCross } from "./segmentsCross";
import type { Vec2 } from "./vec2";

export interface SelfCrossing {
  /** The two edges that meet; edge k runs from vertex k to vertex k + 1. */
  readonly edges: readonly [number, number];
  readonly at: Vec2;
}

/**
 * The first place where a closed polygon crosses or touches itself, or null when it is simple.
 * Neighbouring edges meet in their shared vertex, which is no crossing unless one folds back on the other.
 */
export function selfCrossing(polygon: readonly Vec2[]): SelfCrossing | null {
  const n = polygon.length;
  for (let i = 0; i < n; i++) {
    const a = polygon[i];
    const b = polygon[(i + 1) % n];
    if (!a || !b) continue;
    for (let j = i + 1; j < n; j++) {
      const c = polygon[j];
      const d = polygon[(j + 1) % n];
      if (!c || !d) continue;
      const at = j === i + 1 ? foldsBack(a, b, d) : j === n - 1 && i === 0 ? foldsBack(c, a, b) : segmentsCross(a, b, c, d);
      if (at) return { edges: [i, j], at };
    }
  }
  return null;
}

/** Edges p-q and q-r that run back over one another share more than q. */
function foldsBack(p: Vec2, q: Vec2, r: Vec2): Vec2 | null {
  const [ux, uy, vx, vy] = [p[0] - q[0], p[1] - q[1], r[0] - q[0], r[1] - q[1]];
  const onOneLine = Math.abs(ux * vy - uy * vx) <= 1e-12 * Math.hypot(ux, uy) * Math.hypot(vx, vy);
  return onOneLine && ux * vx + uy * vy > 0 ? q : null;
}
