import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { createPointGrid } from "./createPointGrid";
import type { Network, NetworkEdge } from "./network";
import type { Piece, Repair } from "./piece";
import { placeText } from "./placeText";
import { splitAtEnds } from "./splitAtEnds";

/**
 * Joins the ends of pieces in nodes: those that are one point up to rounding first; then ends that are still loose, nearest first, up
 * to `tolerance` (each such gap is a repair); last, loose ends that stop on another piece split it there.
 */
export function joinEnds(pieces: readonly Piece[], tolerance: number): Network {
  const nodes: Vec2[] = [];
  const grid = createPointGrid(Math.max(1, tolerance));
  const nodeFor = (point: Vec2): number => {
    const [found] = grid.near(point, DRAWN_POINT_MM);
    if (found !== undefined) return found;
    grid.add(point, nodes.length);
    return nodes.push(point) - 1;
  };
  const edges: { from: number; to: number; piece: Piece }[] = pieces.map((piece) => ({ from: nodeFor(piece.from), to: nodeFor(piece.to), piece }));
  const repairs = closeGaps(nodes, edges, grid, tolerance);
  const split = splitAtEnds(nodes, edges.filter(({ from, to }) => from !== to), tolerance);
  return { nodes, edges: split.edges, repairs: [...repairs, ...split.repairs] };
}

function closeGaps(nodes: Vec2[], edges: { from: number; to: number; piece: Piece }[], grid: ReturnType<typeof createPointGrid>, tolerance: number): readonly Repair[] {
  const edgesAt: number[][] = nodes.map(() => []);
  edges.forEach(({ from, to }, e) => { edgesAt[from]?.push(e); edgesAt[to]?.push(e); });
  const loose = (n: number) => edgesAt[n]?.length === 1;
  const pairs: { readonly a: number; readonly b: number; readonly gap: number }[] = [];
  nodes.forEach((point, a) => {
    if (!loose(a)) return;
    for (const b of grid.near(point, tolerance)) {
      const other = nodes[b];
      if (b === a || !other || (loose(b) && b < a) || edgesAt[a]?.[0] === edgesAt[b]?.[0]) continue;
      pairs.push({ a, b, gap: distance(point, other) });
    }
  });
  // Two loose ends belong together before a loose end and a corner.
  pairs.sort((p, q) => Number(!loose(p.b)) - Number(!loose(q.b)) || p.gap - q.gap);
  const repairs: Repair[] = [];
  for (const { a, b, gap } of pairs) {
    const [own] = edgesAt[a] ?? [];
    if (!loose(a) || own === undefined) continue;
    const edge = edges[own];
    const [p, q] = [nodes[a], nodes[b]];
    const facing = edgesAt[b]?.[0];
    if (!edge || !p || !q || facing === undefined || (edge.from === a ? edge.to : edge.from) === b) continue;
    const partner = loose(b) ? edges[facing] : undefined;
    const crossed = partner ? crossing(edge, partner, tolerance) : null;
    const meeting: Vec2 = crossed ?? (partner ? [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2] : q);
    const passed = crossed !== null && partner !== undefined && runsPast(farEnd(nodes, edge, a), p, crossed) && runsPast(farEnd(nodes, partner, b), q, crossed);
    nodes[b] = meeting;
    if (edge.from === a) edge.from = b;
    else edge.to = b;
    edgesAt[b]?.push(own);
    edgesAt[a] = [];
    repairs.push(passed
      ? { kind: "crossing", at: meeting, message: `two lines that crossed ${gap.toFixed(3)} mm past their corner at ${placeText(meeting)} were cut back to it` }
      : { kind: "gap", at: meeting, message: `a gap of ${gap.toFixed(3)} mm at ${placeText(meeting)} was closed` });
  }
  return repairs;
}

const distance = (p: Vec2, q: Vec2): number => Math.hypot(p[0] - q[0], p[1] - q[1]);

const farEnd = (nodes: readonly Vec2[], edge: NetworkEdge, node: number): Vec2 => nodes[edge.from === node ? edge.to : edge.from] ?? [0, 0];

const runsPast = (start: Vec2, end: Vec2, meeting: Vec2): boolean => distance(start, end) > distance(start, meeting) + DRAWN_POINT_MM / 4;

/** Where two straight pieces would meet, when that is within the tolerance of both their ends there. */
function crossing(a: NetworkEdge, b: NetworkEdge, tolerance: number): Vec2 | null {
  if (a.piece.bulge !== 0 || b.piece.bulge !== 0) return null;
  const { from: p, to: q } = a.piece;
  const { from: r, to: s } = b.piece;
  const [ux, uy, vx, vy] = [q[0] - p[0], q[1] - p[1], s[0] - r[0], s[1] - r[1]];
  const cross = ux * vy - uy * vx;
  if (Math.abs(cross) < 0.01 * Math.hypot(ux, uy) * Math.hypot(vx, vy)) return null;
  const t = ((r[0] - p[0]) * vy - (r[1] - p[1]) * vx) / cross;
  const at: Vec2 = [p[0] + ux * t, p[1] + uy * t];
  const close = (ends: readonly Vec2[]) => ends.some((end) => distance(end, at) <= 1.5 * tolerance);
  return close([p, q]) && close([r, s]) ? at : null;
}
