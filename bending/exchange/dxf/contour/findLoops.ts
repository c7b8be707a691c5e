import { DRAWN_POINT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import { createPointGrid } from "./createPointGrid";
import { joinEnds } from "./joinEnds";
import { mergeOverlaps } from "./mergeOverlaps";
import type { Loop, Piece, Repair } from "./piece";
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

/** A contour that was drawn twice is kept once; twins are looked for at the same place only. */
function onlyOnce(loops: readonly Loop[], repairs: Repair[]): readonly Loop[] {
  const kept: Loop[] = [];
  const places = createPointGrid(1);
  for (const loop of loops) {
    const place = placeOf(loop);
    const twin = places.near(place, 2 * DRAWN_POINT_MM).some((id) => { const other = kept[id]; return other !== undefined && sameLoop(other, loop); });
    if (twin) {
      repairs.push({ kind: "drawn twice", at: place, message: `a closed contour drawn twice at ${placeText(place)} was taken out once` });
      continue;
    }
    places.add(place, kept.length);
    kept.push(loop);
  }
  return kept;
}

/** The middle of a circle, else the lower left corner of what the vertices span: the same wherever a contour begins. */
function placeOf(loop: Loop): Vec2 {
  return loop.circle?.centre ?? loop.vertices.reduce<Vec2>(([x, y], vertex) => [Math.min(x, vertex[0]), Math.min(y, vertex[1])], [Infinity, Infinity]);
}

const near = (p: readonly number[], q: readonly number[]) => Math.hypot((p[0] ?? 0) - (q[0] ?? 0), (p[1] ?? 0) - (q[1] ?? 0)) <= 2 * DRAWN_POINT_MM;

function sameLoop(a: Loop, b: Loop): boolean {
  if (a.circle && b.circle) return near(a.circle.centre, b.circle.centre) && Math.abs(a.circle.radius - b.circle.radius) <= 2 * DRAWN_POINT_MM;
  return a.vertices.length === b.vertices.length && a.vertices.every((p) => b.vertices.some((q) => near(p, q)));
}
