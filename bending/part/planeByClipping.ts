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

function stripsOf({ cut, axes, start, end }: CutWithEnds): readonly (readonly Vec2[])[] {
  const [from, to] = [start.at, end.at];
  if (to - from <= SAME_POINT_MM) return [];
  const box = (a: number, b: number, depth: number): readonly Vec2[] => [[a, -OUTSIDE_MM], [b, -OUTSIDE_MM], [b, depth], [a, depth]];
  // The strip laps into the notches, so that no wall without thickness is left between them.
  const strips: (readonly Vec2[])[] = cut.depth > 0 ? [box(from - start.relief / 2, to + end.relief / 2, cut.depth)] : [];
  const depth = Math.max(cut.relief?.depth ?? 0, cut.depth);
  const notch = (a: number, b: number) => (cut.relief?.kind === "round" ? roundNotch(a, b, depth, OUTSIDE_MM) : box(a, b, depth));
  if (start.relief > 0) strips.push(notch(from - start.relief, from));
  if (end.relief > 0) strips.push(notch(to, to + end.relief));
  return strips.map((strip) => strip.map((p) => fromEdge(axes, p)));
}
