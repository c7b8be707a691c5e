import * as polyclip from "polyclip-ts";
import { EMPTY_AREA_MM2, SAME_POINT_MM } from "../core/tolerance";
import { cleanPolygon } from "../geometry/cleanPolygon";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import type { CutWithEnds } from "./cutEnds";
import type { DrawnFace } from "./drawnFace";
import { fromEdge } from "./edgeCut";
import { roundNotch } from "./roundNotch";

/** Strips begin this much outside the edge, so that rounding leaves no sliver there (mm). */
const OUTSIDE_MM = 0.01;

/** The plane part of a face by a general polygon clip, for every case. Null when nothing or more than one piece is left. */
export function planeByClipping(face: DrawnFace, ends: readonly CutWithEnds[]): readonly Vec2[] | null {
  const strips = ends.flatMap(stripsOf);
  const pieces = polyclip.difference([ring(face.points)], ...strips.map((strip) => [ring(strip)]))
    .map((polygon) => cleanPolygon((polygon[0] ?? []).slice(0, -1).map(([x, y]): Vec2 => [x, y])))
    .filter((piece) => Math.abs(signedArea(piece)) > EMPTY_AREA_MM2);
  const [only] = pieces;
  return pieces.length === 1 && only ? (signedArea(only) < 0 ? [...only].reverse() : only) : null;
}

const ring = (points: readonly Vec2[]): [number, number][] => points.map(([x, y]) => [x, y]);

function stripsOf({ cut, axes, start, end: last }: CutWithEnds): readonly (readonly Vec2[])[] {
  const [from, to] = [start.at, last.at];
  if (to - from <= SAME_POINT_MM) return [];
  const box = (a: number, b: number, depth: number, from = -OUTSIDE_MM): readonly Vec2[] => [[a, from], [b, from], [b, depth], [a, depth]];
  const strips: (readonly Vec2[])[] = cut.depth > 0 ? [box(from, to, cut.depth)] : [];
  const depth = Math.max(cut.relief?.depth ?? 0, cut.depth);
  // Beyond a re-entrant corner the sheet goes on outside the edge's line.
  const notch = (a: number, b: number, beyond: number) => (cut.relief?.kind === "round" ? roundNotch(a, b, depth, -beyond) : box(a, b, depth, beyond));
  for (const [end, side] of [[start, -1], [last, 1]] as const) {
    if (end.relief === 0) continue;
    const beyond = end.reaches ? 0 : -OUTSIDE_MM;
    const [a, b] = side < 0 ? [end.at - end.relief, end.at] : [end.at, end.at + end.relief];
    strips.push(notch(a, b, beyond));
    // Laps over strip and notch, so that no wall without thickness is left between them.
    const lap = side < 0 ? [end.at - end.relief / 2, (from + to) / 2] as const : [(from + to) / 2, end.at + end.relief / 2] as const;
    if (cut.depth > 0) strips.push(box(lap[0], lap[1], cut.depth, beyond));
  }
  return strips.map((strip) => strip.map((p) => fromEdge(axes, p)));
}
