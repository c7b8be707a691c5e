import { contourArea } from "../../../part/contourArea";
import type { Network, NetworkEdge } from "./network";
import type { Piece } from "./piece";

export interface TracedLoops {
  /** Closed walks round the outside of each connected part of the network, counter-clockwise. */
  readonly loops: readonly { readonly vertices: readonly (readonly [number, number, number])[]; readonly shapes: readonly number[] }[];
  /** What lies on no such walk: open ends, bridges, lines across the inside. */
  readonly rest: readonly Piece[];
}

/** Radians; edges that leave a node in directions nearer than this touch there. */
const SAME_DIRECTION = 1e-5;

/** Edge `half >> 1`, run forwards when even, backwards when odd. */
type Half = number;

/**
 * The outer boundary of each connected part. Open ends are taken off first; then the walks round all faces are followed (at each node
 * the next edge clockwise), a bridge is an edge with the same face on both sides, and the face of negative area is the outside.
 */
export function traceLoops({ nodes, edges }: Network): TracedLoops {
  let live = withoutOpenEnds(nodes.length, edges);
  for (let bridges = true; bridges; ) {
    const faces = facesOf(nodes, edges, live);
    const faceOf = new Map<Half, number>();
    faces.forEach((face, f) => face.forEach((half) => faceOf.set(half, f)));
    const kept = live.filter((e) => faceOf.get(2 * e) !== faceOf.get(2 * e + 1));
    bridges = kept.length < live.length;
    if (bridges) { live = withoutOpenEnds(nodes.length, edges, kept); continue; }
    const vertex = (half: Half): readonly [number, number, number] => {
      const edge = edges[half >> 1];
      const at = nodes[(half & 1) === 0 ? (edge?.from ?? 0) : (edge?.to ?? 0)] ?? [0, 0];
      return [at[0], at[1], (half & 1) === 0 ? (edge?.piece.bulge ?? 0) : -(edge?.piece.bulge ?? 0)];
    };
    const outer = faces.filter((face) => contourArea({ kind: "path", vertices: face.map(vertex) }) < 0);
    const used = new Set(outer.flatMap((face) => face.map((half) => half >> 1)));
    return {
      // The outside walk runs clockwise; its twins, backwards, run counter-clockwise.
      loops: outer.map((face) => { const back = [...face].reverse().map((half) => half ^ 1); return { vertices: back.map(vertex), shapes: [...new Set(face.map((half) => edges[half >> 1]?.piece.shape ?? 0))] }; }),
      rest: edges.flatMap((edge, e) => (used.has(e) ? [] : [{ ...edge.piece, from: nodes[edge.from] ?? edge.piece.from, to: nodes[edge.to] ?? edge.piece.to }])),
    };
  }
  return { loops: [], rest: edges.map(({ piece }) => piece) };
}

/** Indices of the edges that are left when open ends are taken off again and again. */
function withoutOpenEnds(count: number, edges: readonly NetworkEdge[], among: readonly number[] = edges.map((_, e) => e)): readonly number[] {
  const at: number[][] = Array.from({ length: count }, () => []);
  const alive = new Set(among);
  for (const e of among) { at[edges[e]?.from ?? 0]?.push(e); at[edges[e]?.to ?? 0]?.push(e); }
  const degree = at.map((list) => list.length);
  const open = degree.flatMap((d, n) => (d === 1 ? [n] : []));
  for (let node = open.pop(); node !== undefined; node = open.pop()) {
    for (const e of at[node] ?? []) {
      if (!alive.delete(e)) continue;
      const edge = edges[e];
      for (const end of [edge?.from ?? 0, edge?.to ?? 0]) {
        degree[end] = (degree[end] ?? 0) - 1;
        if (degree[end] === 1) open.push(end);
      }
    }
  }
  return among.filter((e) => alive.has(e));
}

function facesOf(nodes: Network["nodes"], edges: readonly NetworkEdge[], live: readonly number[]): readonly (readonly Half[])[] {
  const leaving = new Map<number, Half[]>();
  for (const e of live) {
    const edge = edges[e];
    if (!edge) continue;
    for (const [node, half] of [[edge.from, 2 * e], [edge.to, 2 * e + 1]] as const) leaving.set(node, [...(leaving.get(node) ?? []), half]);
  }
  const place = new Map<Half, { readonly node: number; readonly index: number }>();
  for (const [node, halves] of leaving) {
    halves.sort((a, b) => { const turn = direction(nodes, edges, a) - direction(nodes, edges, b); return Math.abs(turn) > SAME_DIRECTION ? turn : bend(edges, a) - bend(edges, b); });
    halves.forEach((half, index) => place.set(half, { node, index }));
  }
  const faces: Half[][] = [];
  const seen = new Set<Half>();
  for (const start of place.keys()) {
    if (seen.has(start)) continue;
    const face: Half[] = [];
    for (let half = start; !seen.has(half); ) {
      seen.add(half);
      face.push(half);
      const back = place.get(half ^ 1);
      const round = back ? leaving.get(back.node) : undefined;
      if (!back || !round) break;
      half = round[(back.index + round.length - 1) % round.length] ?? half;
    }
    faces.push(face);
  }
  return faces;
}

/** Bulge of the edge as it leaves: of edges that leave in one direction, the one that turns left more lies further round. */
const bend = (edges: readonly NetworkEdge[], half: Half): number => (edges[half >> 1]?.piece.bulge ?? 0) * ((half & 1) === 0 ? 1 : -1);

/** Direction in which the edge leaves its node: the chord turned back by half the arc's angle. */
function direction(nodes: Network["nodes"], edges: readonly NetworkEdge[], half: Half): number {
  const edge = edges[half >> 1];
  const [p, q] = [nodes[edge?.from ?? 0] ?? [0, 0], nodes[edge?.to ?? 0] ?? [0, 0]];
  const [from, to] = (half & 1) === 0 ? [p, q] : [q, p];
  const bulge = (edge?.piece.bulge ?? 0) * ((half & 1) === 0 ? 1 : -1);
  const angle = Math.atan2(to[1] - from[1], to[0] - from[0]) - 2 * Math.atan(bulge);
  return angle <= -Math.PI ? angle + 2 * Math.PI : angle > Math.PI ? angle - 2 * Math.PI : angle;
}
