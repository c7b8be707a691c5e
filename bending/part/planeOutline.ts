import * as polyclip from "polyclip-ts";
import { EMPTY_AREA_MM2, SAME_POINT_MM } from "../core/tolerance";
import { cleanPolygon } from "../geometry/cleanPolygon";
import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import { cutEnds, type CutWithEnds } from "./cutEnds";
import type { DrawnFace } from "./drawnFace";
import { fromEdge, type EdgeCut } from "./edgeCut";
import { notchEdges } from "./notchEdges";
import { roundNotch } from "./roundNotch";

/** Strips begin this much outside the edge, so that rounding leaves no sliver there (mm). */
const OUTSIDE_MM = 0.01;

/**
 * The plane part of a drawn face: what is left when every bend on its edges has taken its strip and its
 * reliefs. Null when nothing or more than one piece is left.
 *
 * A strip whose inset is 0 runs on to the neighbouring side; where the next edge is bent as well, both
 * run on, so the two plane edges meet in one point and the flanges keep clear of one another.
 */
export function planeOutline(face: DrawnFace, cuts: readonly EdgeCut[]): readonly Vec2[] | null {
  const ends = cutEnds(face, cuts);
  if (ends.every(({ start, end }) => start.reaches === end.reaches) && isConvex(face.points)) {
    const clipped = ends.filter(({ start }) => start.reaches)
      .reduce<readonly Vec2[]>((rest, { cut, axes }) => clipByHalfPlane(rest, fromEdge(axes, [0, cut.depth]), axes.inward), face.points);
    const notched = notchEdges(cleanPolygon(clipped), ends.filter(({ start }) => !start.reaches));
    if (notched) return withArea(notched);
  }
  const strips = ends.flatMap(stripsOf);
  const pieces = polyclip.difference([ring(face.points)], ...strips.map((strip) => [ring(strip)]))
    .map((polygon) => cleanPolygon((polygon[0] ?? []).slice(0, -1).map(([x, y]): Vec2 => [x, y])))
    .filter((piece) => Math.abs(signedArea(piece)) > EMPTY_AREA_MM2);
  const [only] = pieces;
  return pieces.length === 1 && only ? withArea(signedArea(only) < 0 ? [...only].reverse() : only) : null;
}

const ring = (points: readonly Vec2[]): [number, number][] => points.map(([x, y]) => [x, y]);

const withArea = (polygon: readonly Vec2[]) => (signedArea(polygon) > EMPTY_AREA_MM2 ? polygon : null);

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

function isConvex(points: readonly Vec2[]): boolean {
  return points.every((b, i) => {
    const a = points[(i + points.length - 1) % points.length] ?? b;
    const c = points[(i + 1) % points.length] ?? b;
    return (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]) >= 0;
  });
}
