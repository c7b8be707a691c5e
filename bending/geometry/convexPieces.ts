import earcut from "earcut";
import { EMPTY_AREA_MM2 } from "../core/tolerance";
import { signedArea } from "./signedArea";
import type { Vec2 } from "./vec2";

type Ring = readonly number[];

/**
 * An exact partition of a polygon with holes into convex counter-clockwise polygons: a triangulation whose
 * triangles are merged across their shared edges while the union stays convex (Hertel and Mehlhorn, 1983: at
 * most four times the least number for a polygon without holes). Corners are the given points, nothing new.
 */
export function convexPieces(outline: readonly Vec2[], holes: readonly (readonly Vec2[])[] = []): readonly (readonly Vec2[])[] {
  const points = [...outline, ...holes.flat()];
  if (holes.length === 0 && signedArea(outline) > 0 && isConvex(outline.map((_, i) => i), points)) return [outline];
  const starts: number[] = [];
  let next = outline.length;
  for (const hole of holes) {
    starts.push(next);
    next += hole.length;
  }
  const corners = earcut(points.flatMap((p) => [p[0], p[1]]), starts.length ? starts : null, 2);
  const pieces: Ring[] = [];
  for (let i = 0; i + 2 < corners.length; i += 3) {
    const triangle = [corners[i] ?? 0, corners[i + 1] ?? 0, corners[i + 2] ?? 0];
    const area = signedArea(at(triangle, points));
    if (Math.abs(area) > EMPTY_AREA_MM2) pieces.push(area > 0 ? triangle : [...triangle].reverse());
  }
  return merge(pieces, points).map((ring) => at(ring, points));
}

const at = (ring: Ring, points: readonly Vec2[]): readonly Vec2[] => ring.map((i) => points[i] ?? [0, 0]);

/** Every shared edge is tried once; an edge that cannot be dissolved now never can later, as pieces only grow. */
function merge(triangles: readonly Ring[], points: readonly Vec2[]): readonly Ring[] {
  const ringOf: (Ring | null)[] = [...triangles];
  const owner = triangles.map((_, i) => i);
  const find = (i: number): number => {
    let root = i;
    while (owner[root] !== root) root = owner[root] ?? root;
    return root;
  };
  const edges = new Map<string, number>();
  triangles.forEach((ring, piece) => {
    ring.forEach((from, k) => {
      const to = ring[(k + 1) % ring.length] ?? 0;
      const other = edges.get(`${to},${from}`);
      if (other === undefined) {
        edges.set(`${from},${to}`, piece);
        return;
      }
      const [a, b] = [find(other), find(piece)];
      const [first, second] = [ringOf[a], ringOf[b]];
      if (a === b || !first || !second) return;
      const union = join(first, second, from, to);
      if (!union || !isConvex(union, points)) return;
      ringOf[a] = union;
      ringOf[b] = null;
      owner[b] = a;
    });
  });
  return ringOf.filter((ring): ring is Ring => ring !== null);
}

/** `first` holds the edge to -> from, `second` holds from -> to: the ring round both. */
function join(first: Ring, second: Ring, from: number, to: number): Ring | null {
  const i = first.indexOf(from);
  const j = second.indexOf(to);
  if (i < 0 || j < 0 || first[(i + first.length - 1) % first.length] !== to) return null;
  if (second[(j + second.length - 1) % second.length] !== from) return null;
  const a = [...first.slice(i), ...first.slice(0, i)];
  const b = [...second.slice(j), ...second.slice(0, j)];
  return [...a, ...b.slice(1, -1)];
}

function isConvex(ring: Ring, points: readonly Vec2[]): boolean {
  const n = ring.length;
  let turned = 0;
  for (let k = 0; k < n; k++) {
    const [a, b, c] = [points[ring[k] ?? 0], points[ring[(k + 1) % n] ?? 0], points[ring[(k + 2) % n] ?? 0]];
    if (!a || !b || !c) return false;
    const [ux, uy, vx, vy] = [b[0] - a[0], b[1] - a[1], c[0] - b[0], c[1] - b[1]];
    const cross = ux * vy - uy * vx;
    const dot = ux * vx + uy * vy;
    if (cross < -1e-12 * Math.hypot(ux, uy) * Math.hypot(vx, vy) || (cross === 0 && dot < 0)) return false;
    turned += Math.atan2(cross, dot);
  }
  return turned < 2 * Math.PI + 1e-6;
}
