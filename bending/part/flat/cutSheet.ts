import { invariant } from "../../core/invariant";
import { EMPTY_AREA_MM2, SAME_POINT_MM } from "../../core/tolerance";
import { polygonContains } from "../../geometry/polygonContains";
import { signedArea } from "../../geometry/signedArea";
import type { Vec2 } from "../../geometry/vec2";
import type { RingPlace, Rings } from "./ringPlace";

/** An end of a cut: on the boundary, or free within the sheet. */
export type CutEnd = RingPlace | { readonly point: Vec2 };

export interface SheetCut {
  readonly from: CutEnd;
  readonly to: CutEnd;
}

export interface CutPiece {
  readonly outline: readonly Vec2[];
  readonly holes: readonly (readonly Vec2[])[];
}

export interface CutUp {
  readonly pieces: readonly CutPiece[];
  /** For each cut the pieces on its left and on its right. */
  readonly sides: readonly { readonly left: number; readonly right: number }[];
}

interface HalfEdge {
  readonly from: number;
  readonly to: number;
  /** Index of the cut, and whether it is run from its start; null on the boundary. */
  readonly cut: { readonly index: number; readonly along: boolean } | null;
}

/**
 * The pieces into which straight cuts part a sheet. The cuts may share ends but not cross one another or the boundary: every
 * piece is then walked round with the material on the left.
 */
export function cutSheet(rings: Rings, cuts: readonly SheetCut[]): CutUp {
  const graph = createGraph(rings, cuts);
  const loopOf = new Map<HalfEdge, number>();
  const loops: (readonly number[])[] = [];
  for (const first of graph.halfEdges) {
    if (loopOf.has(first)) continue;
    const loop: number[] = [];
    for (let edge: HalfEdge = first; !loopOf.has(edge); edge = graph.after(edge)) {
      loopOf.set(edge, loops.length);
      loop.push(edge.from);
    }
    loops.push(loop);
  }
  const outlines = loops.map((loop) => loop.map((node): Vec2 => graph.points[node] ?? [0, 0]));
  const areas = outlines.map((outline) => signedArea(outline));
  const pieceOf = new Map<number, number>();
  areas.forEach((area, loop) => { if (area > EMPTY_AREA_MM2) pieceOf.set(loop, pieceOf.size); });
  const outer = [...pieceOf.keys()];
  const holes = outer.map((): (readonly Vec2[])[] => []);
  areas.forEach((area, loop) => {
    const [point] = outlines[loop] ?? [];
    if (area > EMPTY_AREA_MM2 || !point) return;
    const home = outer.filter((candidate) => polygonContains(outlines[candidate] ?? [], point)).sort((a, b) => (areas[a] ?? 0) - (areas[b] ?? 0))[0];
    if (home === undefined) return;
    pieceOf.set(loop, pieceOf.get(home) ?? -1);
    if (area < -EMPTY_AREA_MM2) holes[pieceOf.get(home) ?? -1]?.push(outlines[loop] ?? []);
  });
  const sides = cuts.map(() => ({ left: -1, right: -1 }));
  for (const [edge, loop] of loopOf) {
    const side = edge.cut ? sides[edge.cut.index] : undefined;
    if (side && edge.cut) side[edge.cut.along ? "left" : "right"] = pieceOf.get(loop) ?? -1;
  }
  return { pieces: outer.map((loop, i) => ({ outline: outlines[loop] ?? [], holes: holes[i] ?? [] })), sides };
}

/** The boundary with the ends of all cuts put in as corners, and the cuts both ways. */
function createGraph(rings: Rings, cuts: readonly SheetCut[]) {
  const points: Vec2[] = [];
  const halfEdges: HalfEdge[] = [];
  const nodeAt = ringNodes(rings, cuts, points, halfEdges);
  const free: number[] = [];
  const nodeOf = (end: CutEnd): number => {
    if ("ring" in end) return nodeAt.get(end) ?? -1;
    const known = free.find((node) => !apart(points[node] ?? [NaN, NaN], end.point));
    if (known !== undefined) return known;
    free.push(points.push(end.point) - 1);
    return points.length - 1;
  };
  const seen = new Set<string>();
  cuts.forEach((cut, index) => {
    const [from, to] = [nodeOf(cut.from), nodeOf(cut.to)];
    const key = `${Math.min(from, to)} ${Math.max(from, to)}`;
    if (from === to || seen.has(key)) return;
    seen.add(key);
    halfEdges.push({ from, to, cut: { index, along: true } }, { from: to, to: from, cut: { index, along: false } });
  });
  const leaving = points.map((): HalfEdge[] => []);
  for (const edge of halfEdges) leaving[edge.from]?.push(edge);
  const heading = (from: number, to: number) => {
    const [p, q] = [points[from] ?? [0, 0], points[to] ?? [0, 0]];
    return Math.atan2(q[1] - p[1], q[0] - p[0]);
  };
  /** The first edge clockwise from where one came from has the same piece on its left. */
  const after = (edge: HalfEdge): HalfEdge => {
    const [only, ...others] = leaving[edge.to] ?? [];
    invariant(only, "cutSheet: every corner is left again");
    if (others.length === 0) return only;
    const back = heading(edge.to, edge.from);
    const turned = (choice: HalfEdge) => {
      const angle = (back - heading(choice.from, choice.to) + 4 * Math.PI) % (2 * Math.PI);
      return choice.to === edge.from || angle < NO_TURN ? 2 * Math.PI : angle;
    };
    return others.reduce((best, choice) => (turned(choice) < turned(best) ? choice : best), only);
  };
  return { points, halfEdges, after };
}

/** Radians; a cut that leaves along the edge one came by lies behind it. */
const NO_TURN = 1e-9;

/** Lays the rings down as nodes and edges, and tells the node of every cut's end that lies on them. */
function ringNodes(rings: Rings, cuts: readonly SheetCut[], points: Vec2[], halfEdges: HalfEdge[]): ReadonlyMap<CutEnd, number> {
  const onEdge = new Map<string, { readonly end: CutEnd; readonly share: number }[]>();
  for (const end of cuts.flatMap((cut) => [cut.from, cut.to])) {
    if (!("ring" in end)) continue;
    const ring = rings[end.ring] ?? [];
    const next = (end.edge + 1) % ring.length;
    const atNext = !apart(ring[next] ?? [NaN, NaN], end.point);
    const key = `${end.ring} ${atNext ? next : end.edge}`;
    onEdge.set(key, [...(onEdge.get(key) ?? []), { end, share: atNext || !apart(ring[end.edge] ?? [NaN, NaN], end.point) ? 0 : end.share }]);
  }
  const nodeAt = new Map<CutEnd, number>();
  rings.forEach((ring, r) => {
    const first = points.length;
    ring.forEach((corner, e) => {
      points.push(corner);
      for (const { end, share } of (onEdge.get(`${r} ${e}`) ?? []).sort((a, b) => a.share - b.share)) {
        const last = points[points.length - 1];
        if (share > 0 && last && apart(last, end.point)) points.push(end.point);
        nodeAt.set(end, points.length - 1);
      }
    });
    for (let node = first; node < points.length; node++) halfEdges.push({ from: node, to: node + 1 < points.length ? node + 1 : first, cut: null });
  });
  return nodeAt;
}

const apart = (a: Vec2, b: Vec2) => Math.hypot(a[0] - b[0], a[1] - b[1]) > SAME_POINT_MM;
