import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import type { NetworkEdge } from "./network";
import type { Piece, Repair } from "./piece";
import { placeText } from "./placeText";
import { splitPiece } from "./splitPiece";

/** With more loose ends than this the drawing is no flat, and the search would be long. */
const MOST_LOOSE = 2000;

/** A loose end that stops on another piece (within `tolerance`, not at its ends) splits it there. Nodes may be added and moved. */
export function splitAtEnds(nodes: Vec2[], given: readonly NetworkEdge[], tolerance: number): { readonly edges: readonly NetworkEdge[]; readonly repairs: readonly Repair[] } {
  const degree = nodes.map(() => 0);
  const bump = (n: number) => { degree[n] = (degree[n] ?? 0) + 1; };
  given.forEach(({ from, to }) => { bump(from); bump(to); });
  const loose = degree.flatMap((count, n) => (count === 1 ? [n] : []));
  const repairs: Repair[] = [];
  if (loose.length === 0 || loose.length > MOST_LOOSE) return { edges: given, repairs };
  const edges = [...given];
  for (const node of loose) {
    const point = nodes[node];
    if (!point) continue;
    const best = nearestSplit(nodes, edges, node, point, tolerance);
    if (best === null) continue;
    const { index, at, off, halves } = best;
    const edge = edges[index];
    if (!edge) continue;
    nodes[node] = at;
    edges.splice(index, 1, { from: edge.from, to: node, piece: halves[0] }, { from: node, to: edge.to, piece: halves[1] });
    if (off > DRAWN_POINT_MM) repairs.push({ kind: "gap", at, message: `a line that stopped ${off.toFixed(3)} mm off another at ${placeText(at)} was led to it` });
  }
  return { edges, repairs };
}

interface Split { readonly index: number; readonly at: Vec2; readonly off: number; readonly halves: readonly [Piece, Piece] }

function nearestSplit(nodes: readonly Vec2[], edges: readonly NetworkEdge[], node: number, point: Vec2, tolerance: number): Split | null {
  let best: Split | null = null;
  for (const [index, edge] of edges.entries()) {
    if (edge.from === node || edge.to === node) continue;
    const [from, to] = [nodes[edge.from] ?? edge.piece.from, nodes[edge.to] ?? edge.piece.to];
    // An arc stands off its chord by half the bulge times the chord, and past its ends by no more.
    const room = tolerance + (edge.piece.bulge === 0 ? 0 : Math.abs(edge.piece.bulge) * (Math.abs(to[0] - from[0]) + Math.abs(to[1] - from[1])));
    if (outside(from[0], to[0], point[0], room) || outside(from[1], to[1], point[1], room)) continue;
    const halves = splitPiece({ ...edge.piece, from, to }, point, tolerance);
    if (!halves) continue;
    const at = halves[0].to;
    const off = Math.hypot(at[0] - point[0], at[1] - point[1]);
    if (best === null || off < best.off) best = { index, at, off, halves };
  }
  return best;
}

const outside = (a: number, b: number, value: number, room: number): boolean => value < Math.min(a, b) - room || value > Math.max(a, b) + room;
