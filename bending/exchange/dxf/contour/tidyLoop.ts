import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { bulgeCentre } from "./bulgeCentre";
import { contourArea } from "../../../part/contourArea";
import type { Loop } from "./piece";

type Vertex = readonly [number, number, number];

/** Farthest that a vertex in the middle of a straight run may stand off it: rounding of files with six decimals. */
const STRAIGHT_MM = 5e-6;
/** So many vertices in a row are left out at most; a run of more is a curve of very short lines as a rule. */
const LONGEST_RUN = 50;

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
  if (n < 4) return vertices;
  const kept: Vertex[] = [];
  // Vertices left out since the last one kept: each must stay on the line that takes their place.
  let run: Vertex[] = [];
  vertices.forEach((q, i) => {
    const [p, r] = [kept[kept.length - 1] ?? vertices[n - 1], vertices[(i + 1) % n]];
    const needless = p && r && p[2] === 0 && q[2] === 0 && run.length < LONGEST_RUN && [...run, q].every((one) => liesBetween(p, one, r));
    if (needless) run.push(q);
    else {
      kept.push(q);
      run = [];
    }
  });
  return kept.length >= 3 ? kept : vertices;
}

function liesBetween(p: Vertex, q: Vertex, r: Vertex): boolean {
  const [ux, uy, vx, vy] = [q[0] - p[0], q[1] - p[1], r[0] - q[0], r[1] - q[1]];
  return ux * vx + uy * vy > 0 && Math.abs(ux * vy - uy * vx) <= STRAIGHT_MM * Math.hypot(ux + vx, uy + vy);
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
