import type { Vec2 } from "../../../geometry/vec2";
import { bulgeThrough } from "./bulgeThrough";

const DEEPEST = 12;
const PROBES = [1 / 8, 1 / 4, 3 / 8, 5 / 8, 3 / 4, 7 / 8];

export interface FittedEdge { readonly from: Vec2; readonly to: Vec2; readonly bulge: number }

/**
 * A curve over [start, end] as straight edges and arcs that stand no farther than `tolerance` off it at the points probed: the arc
 * through the ends and the middle, halved until it fits.
 */
export function fitArcs(at: (t: number) => Vec2, start: number, end: number, tolerance: number): readonly FittedEdge[] {
  const edges: FittedEdge[] = [];
  const fit = (a: number, p: Vec2, b: number, r: Vec2, depth: number): void => {
    const middle = (a + b) / 2;
    const q = at(middle);
    const probes = PROBES.map((share) => at(a + (b - a) * share));
    const straight = [q, ...probes].every((point) => offChord(p, r, point) <= tolerance / 4);
    const bulge = straight ? 0 : bulgeThrough(p, q, r);
    if (depth >= DEEPEST || straight || (Math.abs(bulge) < 1 && probes.every((point) => offArc(p, r, bulge, point) <= tolerance))) {
      edges.push({ from: p, to: r, bulge: depth >= DEEPEST ? 0 : bulge });
      return;
    }
    fit(a, p, middle, q, depth + 1);
    fit(middle, q, b, r, depth + 1);
  };
  fit(start, at(start), end, at(end), 0);
  return edges;
}

function offChord(p: Vec2, r: Vec2, q: Vec2): number {
  const [dx, dy] = [r[0] - p[0], r[1] - p[1]];
  const length = Math.hypot(dx, dy);
  return length === 0 ? Math.hypot(q[0] - p[0], q[1] - p[1]) : Math.abs(dx * (q[1] - p[1]) - dy * (q[0] - p[0])) / length;
}

function offArc(p: Vec2, r: Vec2, bulge: number, q: Vec2): number {
  const [dx, dy] = [r[0] - p[0], r[1] - p[1]];
  const half = 2 * Math.atan(bulge);
  const radius = Math.hypot(dx, dy) / (2 * Math.sin(half));
  const toCentre = 0.5 / Math.tan(half);
  const [cx, cy] = [(p[0] + r[0]) / 2 - dy * toCentre, (p[1] + r[1]) / 2 + dx * toCentre];
  return Math.abs(Math.hypot(q[0] - cx, q[1] - cy) - Math.abs(radius));
}
