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
  const edges = polygon.map((a, i): Edge => {
    const b = polygon[(i + 1) % n] ?? a;
    return { i, a, b, from: Math.min(a[0], b[0]), to: Math.max(a[0], b[0]) };
  });
  const swept = [...edges].sort((p, q) => p.from - q.from || p.i - q.i);
  let first: SelfCrossing | null = null;
  swept.forEach((p, k) => {
    for (let next = k + 1; next < n; next++) {
      const q = swept[next];
      if (!q || q.from > p.to) break;
      const [e, f] = p.i < q.i ? [p, q] : [q, p];
      if (first && (e.i > first.edges[0] || (e.i === first.edges[0] && f.i > first.edges[1]))) continue;
      const at = meet(e, f, n);
      if (at) first = { edges: [e.i, f.i], at };
    }
  });
  return first;
}

interface Edge {
  readonly i: number;
  readonly a: Vec2;
  readonly b: Vec2;
  /** Reach in x. */
  readonly from: number;
  readonly to: number;
}

function meet(e: Edge, f: Edge, n: number): Vec2 | null {
  if (f.i === e.i + 1) return foldsBack(e.a, e.b, f.b);
  if (e.i === 0 && f.i === n - 1) return foldsBack(f.a, e.a, e.b);
  return segmentsCross(e.a, e.b, f.a, f.b);
}

/** Edges p-q and q-r that run back over one another share more than q. */
function foldsBack(p: Vec2, q: Vec2, r: Vec2): Vec2 | null {
  const [ux, uy, vx, vy] = [p[0] - q[0], p[1] - q[1], r[0] - q[0], r[1] - q[1]];
  const onOneLine = Math.abs(ux * vy - uy * vx) <= 1e-12 * Math.hypot(ux, uy) * Math.hypot(vx, vy);
  return onOneLine && ux * vx + uy * vy > 0 ? q : null;
}
