import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { joinEnds } from "./joinEnds";
import { mergeOverlaps } from "./mergeOverlaps";
import type { Loop, Piece, Repair } from "./piece";
import { pieceMiddle } from "./pieceMiddle";
import { placeText } from "./placeText";
import { removeRepeats } from "./removeRepeats";
import { tidyLoop } from "./tidyLoop";
import { traceLoops } from "./traceLoops";

export interface FoundLoops {
  /** Largest first. */
  readonly loops: readonly Loop[];
  readonly repairs: readonly Repair[];
  /** Pieces that are on no closed contour. */
  readonly rest: readonly Piece[];
}

/**
 * Closed contours out of drawn pieces. `chains` are the pieces of one shape each, in order; a shape that closes by itself is a contour
 * as it is, everything else is joined end to end, gaps closed up to `tolerance` (mm).
 */
export function findLoops(chains: readonly (readonly Piece[])[], tolerance: number): FoundLoops {
  const repairs: Repair[] = [];
  const whole: Loop[] = [];
  const open: Piece[] = [];
  for (const chain of chains) {
    const loop = closesByItself(chain) ? tidyLoop(chain.map(({ from, bulge }) => [from[0], from[1], bulge]), chain.slice(0, 1).map(({ shape }) => shape)) : null;
    if (loop) whole.push(loop);
    else open.push(...chain);
  }
  const single = removeRepeats(open);
  const merged = mergeOverlaps(single.pieces);
  const network = joinEnds(merged.pieces, tolerance);
  const traced = traceLoops(network);
  repairs.push(...single.repairs, ...merged.repairs, ...network.repairs);
  const joined = traced.loops.flatMap(({ vertices, shapes }) => tidyLoop(vertices, shapes) ?? []);
  return { loops: onlyOnce([...joined, ...whole].sort((a, b) => b.area - a.area), repairs), repairs, rest: traced.rest };
}

function closesByItself(chain: readonly Piece[]): boolean {
  const [first, last] = [chain[0], chain[chain.length - 1]];
  if (!first || !last || chain.length < 2) return false;
  const meet = (p: Vec2, q: Vec2) => Math.hypot(p[0] - q[0], p[1] - q[1]) <= DRAWN_POINT_MM;
  return meet(first.from, last.to) && chain.every((piece, i) => i === 0 || meet(chain[i - 1]?.to ?? piece.from, piece.from));
}

/** A contour that was drawn twice is kept once; loops come sorted by area. */
function onlyOnce(loops: readonly Loop[], repairs: Repair[]): readonly Loop[] {
  const kept: Loop[] = [];
  for (const loop of loops) {
    let twin = false;
    for (let i = kept.length - 1; i >= 0 && !twin; i--) {
      const other = kept[i];
      if (!other || other.area - loop.area > 1e-3 * Math.max(1, Math.sqrt(loop.area))) break;
      twin = sameLoop(other, loop);
    }
    if (!twin) kept.push(loop);
    else {
      const [x, y, bulge] = loop.vertices[0] ?? [0, 0, 0];
      const next = loop.vertices[1] ?? [x, y, 0];
      const at = loop.circle?.centre ?? pieceMiddle({ from: [x, y], to: [next[0], next[1]], bulge });
      repairs.push({ kind: "drawn twice", at, message: `a closed contour drawn twice at ${placeText(at)} was taken out once` });
    }
  }
  return kept;
}

function sameLoop(a: Loop, b: Loop): boolean {
  const near = (p: readonly number[], q: readonly number[]) => Math.hypot((p[0] ?? 0) - (q[0] ?? 0), (p[1] ?? 0) - (q[1] ?? 0)) <= 2 * DRAWN_POINT_MM;
  if (a.circle && b.circle) return near(a.circle.centre, b.circle.centre) && Math.abs(a.circle.radius - b.circle.radius) <= 2 * DRAWN_POINT_MM;
  return a.vertices.length === b.vertices.length && a.vertices.every((p) => b.vertices.some((q) => near(p, q)));
}
