import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { bulgeCentre } from "./bulgeCentre";
import { contourArea } from "../../../part/contourArea";
import type { Loop } from "./piece";

type Vertex = readonly [number, number, number];

/** Farthest that a vertex in the middle of a straight run may stand off it: rounding of files with six decimals. */
const STRAIGHT_MM = 2e-5;

/** A closed contour without repeated points and points in the middle of straight runs; counter-clockwise; null when it holds no area. */
export function tidyLoop(vertices: readonly Vertex[], shapes: readonly number[]): Loop | null {
  const apart = vertices.filter((vertex, i) => {
    const next = vertices[(i + 1) % vertices.length];
    return next && Math.hypot(next[0] - vertex[0], next[1] - vertex[1]) > DRAWN_POINT_MM / 2;
  });
  const kept = withoutMidpoints(apart);
  const signed = contourArea({ kind: "path", vertices: kept });
  if (kept.length < 2 || Math.abs(signed) < 1e-6) return null;
  return { vertices: signed < 0 ? reversed(kept) : kept, circle: circleOf(kept), shapes, area: Math.abs(signed) };
}

function withoutMidpoints(vertices: readonly Vertex[]): readonly Vertex[] {
  const n = vertices.length;
  const needless = (i: number): boolean => {
    const [p, q, r] = [vertices[(i + n - 1) % n], vertices[i], vertices[(i + 1) % n]];
    if (!p || !q || !r || p[2] !== 0 || q[2] !== 0) return false;
    const [ux, uy, vx, vy] = [q[0] - p[0], q[1] - p[1], r[0] - q[0], r[1] - q[1]];
    return ux * vx + uy * vy > 0 && Math.abs(ux * vy - uy * vx) <= STRAIGHT_MM * Math.min(Math.hypot(ux, uy), Math.hypot(vx, vy));
  };
  return n < 4 ? vertices : vertices.filter((_, i) => !needless(i));
}

/** The same contour the other way round. */
function reversed(vertices: readonly Vertex[]): readonly Vertex[] {
  const n = vertices.length;
  return vertices.map((_, i): Vertex => {
    const [at, before] = [vertices[n - 1 - i] ?? [0, 0, 0], vertices[(2 * n - 2 - i) % n] ?? [0, 0, 0]];
    return [at[0], at[1], before[2] === 0 ? 0 : -before[2]];
  });
}

function circleOf(vertices: readonly Vertex[]): Loop["circle"] {
  if (vertices.some(([, , bulge]) => bulge === 0)) return null;
  const arcs = vertices.map(([x, y, bulge], i) => { const next = vertices[(i + 1) % vertices.length] ?? [x, y, 0]; return bulgeCentre([x, y], [next[0], next[1]], bulge); });
  const [first] = arcs;
  const same = first && arcs.every(({ centre, radius }) => Math.hypot(centre[0] - first.centre[0], centre[1] - first.centre[1]) <= DRAWN_POINT_MM && Math.abs(radius - first.radius) <= DRAWN_POINT_MM);
  const turned = vertices.reduce((sum, [, , bulge]) => sum + 4 * Math.atan(bulge), 0);
  return same && Math.abs(Math.abs(turned) - 2 * Math.PI) < 1e-3 ? { centre: first.centre as Vec2, radius: first.radius } : null;
}
