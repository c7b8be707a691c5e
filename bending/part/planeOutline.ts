import * as polyclip from "polyclip-ts";
import { EMPTY_AREA_MM2, SAME_POINT_MM } from "../core/tolerance";
import { cleanPolygon } from "../geometry/cleanPolygon";
import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import { signedArea } from "../geometry/signedArea";
import type { Vec2 } from "../geometry/vec2";
import { cornerReach } from "./cornerReach";
import type { DrawnFace } from "./drawnFace";
import { edgeAxes, fromEdge, type EdgeAxes, type EdgeCut } from "./edgeCut";
import { notchEdges } from "./notchEdges";

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
  const ends = cuts.map((cut) => ({ cut, axes: edgeAxes(cut.edge), ...reaches(cut, cuts) }));
  if (ends.every(({ start, end }) => start === end) && isConvex(face.points)) {
    const clipped = ends.filter(({ start }) => start)
      .reduce<readonly Vec2[]>((rest, { cut, axes }) => clipByHalfPlane(rest, fromEdge(axes, [0, cut.depth]), axes.inward), face.points);
    const notched = notchEdges(cleanPolygon(clipped), ends.filter(({ start }) => !start).map(({ cut }) => cut));
    if (notched) return withArea(notched);
  }
  const strips = ends.flatMap(({ cut, axes, start, end }) => stripsOf(face, cut, axes, start, end));
  const pieces = polyclip.difference([ring(face.points)], ...strips.map((strip) => [ring(strip)]))
    .map((polygon) => cleanPolygon((polygon[0] ?? []).slice(0, -1).map(([x, y]): Vec2 => [x, y])))
    .filter((piece) => Math.abs(signedArea(piece)) > EMPTY_AREA_MM2);
  const [only] = pieces;
  return pieces.length === 1 && only ? withArea(signedArea(only) < 0 ? [...only].reverse() : only) : null;
}

const ring = (points: readonly Vec2[]): [number, number][] => points.map(([x, y]) => [x, y]);

const withArea = (polygon: readonly Vec2[]) => (signedArea(polygon) > EMPTY_AREA_MM2 ? polygon : null);

/** Whether the strip runs on past the flange's start and end: no inset, or less than the bent neighbour takes. */
function reaches(cut: EdgeCut, cuts: readonly EdgeCut[]): { readonly start: boolean; readonly end: boolean } {
  const neighbourTakes = (corner: Vec2, atStart: boolean) => {
    const neighbour = cuts.find((other) => same(atStart ? other.edge.to : other.edge.from, corner));
    if (!neighbour) return 0;
    const itsInset = atStart ? neighbour.end : neighbour.start;
    return itsInset <= cut.depth + SAME_POINT_MM ? neighbour.depth : 0;
  };
  return {
    start: cut.start <= neighbourTakes(cut.edge.from, true) + SAME_POINT_MM,
    end: cut.end <= neighbourTakes(cut.edge.to, false) + SAME_POINT_MM,
  };
}

const same = (a: Vec2, b: Vec2) => Math.hypot(a[0] - b[0], a[1] - b[1]) <= SAME_POINT_MM;

function stripsOf(face: DrawnFace, cut: EdgeCut, axes: EdgeAxes, start: boolean, end: boolean): readonly (readonly Vec2[])[] {
  const from = start ? -cornerReach(face.points, axes, cut.depth, "start") : cut.start;
  const to = end ? axes.length + cornerReach(face.points, axes, cut.depth, "end") : axes.length - cut.end;
  if (to - from <= SAME_POINT_MM) return [];
  const box = (a: number, b: number, depth: number): readonly Vec2[] => [[a, -OUTSIDE_MM], [b, -OUTSIDE_MM], [b, depth], [a, depth]];
  const relief = cut.relief && cut.relief.kind !== "tear" ? cut.relief : null;
  // The strip laps into the notches, so that no wall without thickness is left between them.
  const lap = relief ? relief.width / 2 : 0;
  const strips: (readonly Vec2[])[] = cut.depth > 0 ? [box(start ? from : from - lap, end ? to : to + lap, cut.depth)] : [];
  if (relief) {
    const depth = Math.max(relief.depth, cut.depth);
    const notch = (a: number, b: number) => (relief.kind === "round" ? roundNotch(a, b, depth) : box(a, b, depth));
    if (!start) strips.push(notch(from - relief.width, from));
    if (!end) strips.push(notch(to, to + relief.width));
  }
  return strips.map((strip) => strip.map((p) => fromEdge(axes, p)));
}

/** A notch with a half-round end; when it is wider than deep, the half round begins at the edge. */
function roundNotch(a: number, b: number, depth: number): readonly Vec2[] {
  const radius = (b - a) / 2;
  const straight = Math.max(0, depth - radius);
  const arc = Array.from({ length: 17 }, (_, i): Vec2 => {
    const angle = (Math.PI * i) / 16;
    return [(a + b) / 2 + radius * Math.cos(angle), straight + Math.min(radius, depth) * Math.sin(angle)];
  });
  return [[a, -OUTSIDE_MM], [b, -OUTSIDE_MM], ...arc];
}

function isConvex(points: readonly Vec2[]): boolean {
  return points.every((b, i) => {
    const a = points[(i + points.length - 1) % points.length] ?? b;
    const c = points[(i + 1) % points.length] ?? b;
    return (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]) >= 0;
  });
}
