import { SAME_POINT_MM } from "../core/tolerance";
import { cleanPolygon } from "../geometry/cleanPolygon";
import { selfCrossing } from "../geometry/selfCrossing";
import type { Vec2 } from "../geometry/vec2";
import type { CutWithEnds } from "./cutEnds";
import type { DrawnFace } from "./drawnFace";
import { edgeAxes, fromEdge, onEdge, type EdgeAxes } from "./edgeCut";
import { roundNotch } from "./roundNotch";

/** A drawn edge with its cuts in order along it. */
interface Walked {
  readonly axes: EdgeAxes;
  readonly cuts: readonly CutWithEnds[];
}

/**
 * The plane part of a face by walking round its outline and stepping in at every cut: what nearly every face is. Null when that is
 * not the whole story: cuts that meet one another, run over a corner or leave nothing.
 */
export function planeByWalking(face: DrawnFace, ends: readonly CutWithEnds[]): readonly Vec2[] | null {
  const n = face.points.length;
  const walked = face.points.map((from, i): Walked => {
    const to = face.points[(i + 1) % n] ?? from;
    const cuts = ends.filter(({ cut }) => same(cut.edge.from, from) && same(cut.edge.to, to));
    return { axes: edgeAxes({ from, to }), cuts: [...cuts].sort((a, b) => a.start.at - b.start.at) };
  });
  if (walked.reduce((sum, { cuts }) => sum + cuts.length, 0) !== ends.length || ends.some(({ cut }) => cut.depth < 0)) return null;
  const path: Vec2[] = [];
  for (const [i, edge] of walked.entries()) {
    const before = walked[(i + n - 1) % n];
    const corner = before && cornerBetween(before, edge);
    if (!corner) return null;
    path.push(...corner);
    for (const [k, one] of edge.cuts.entries()) {
      const next = edge.cuts[k + 1];
      if (next && one.end.at + one.end.relief >= next.start.at - next.start.relief - SAME_POINT_MM) return null;
      if (one.end.at - one.start.at <= SAME_POINT_MM) return null;
      if (!one.start.reaches) path.push(...notch(one, true));
      if (!one.end.reaches) path.push(...notch(one, false));
    }
  }
  const clean = cleanPolygon(path);
  return clean.length > 2 && keepsOrder(clean, ends) && !selfCrossing(clean) ? clean : null;
}

const same = (a: Vec2, b: Vec2) => Math.hypot(a[0] - b[0], a[1] - b[1]) <= SAME_POINT_MM;

/** Down into the relief and over to the strip at a flange's start, or the same the other way at its end. */
function notch({ cut, axes, start, end }: CutWithEnds, atStart: boolean): readonly Vec2[] {
  const { at, relief: width } = atStart ? start : end;
  const outer = atStart ? at - width : at + width;
  const deep = Math.max(cut.relief?.depth ?? 0, cut.depth);
  const down: readonly Vec2[] = width === 0 ? [[at, 0], [at, cut.depth]]
    : cut.relief?.kind === "round" ? [[outer, 0], ...roundFrom(outer, at, deep, cut.depth), [at, cut.depth]]
      : [[outer, 0], [outer, deep], [at, deep], [at, cut.depth]];
  return (atStart ? down : [...down].reverse()).map((p) => fromEdge(axes, p));
}

/** The round end of a notch, from its far side on until it comes down to the strip on the side of the flange. */
function roundFrom(outer: number, at: number, deep: number, strip: number): readonly Vec2[] {
  const arc = roundNotch(Math.min(outer, at), Math.max(outer, at), deep, 0).filter(([, h]) => h > SAME_POINT_MM);
  const ordered = outer < at ? [...arc].reverse() : arc;
  const middle = (outer + at) / 2;
  const under = ordered.findIndex(([a, h]) => h < strip && (a - middle) * (at - middle) > 0);
  const [last, first] = [ordered[under - 1], ordered[under]];
  if (!last || !first) return ordered;
  const share = (last[1] - strip) / (last[1] - first[1]);
  return [...ordered.slice(0, under), [last[0] + (first[0] - last[0]) * share, strip]];
}

/** The outline's corner between two edges when the cuts at it have been taken; null when a cut runs over an edge beside it. */
function cornerBetween(before: Walked, after: Walked): readonly Vec2[] | null {
  const [ending, beginning] = [before.cuts[before.cuts.length - 1], after.cuts[0]];
  const first = ending?.end.reaches ? ending : null;
  const second = beginning?.start.reaches ? beginning : null;
  const corner = after.axes.origin;
  if (!first && !second) return [corner];
  if ((first && first.end.relief > 0) || (second && second.start.relief > 0)) return null;
  const [u, v] = [before.axes.along, after.axes.along];
  const turn = u[0] * v[1] - u[1] * v[0];
  if (turn <= SAME_POINT_MM) {
    return [
      ...(first ? [fromEdge(before.axes, [before.axes.length, first.cut.depth])] : []), corner,
      ...(second ? [fromEdge(after.axes, [0, second.cut.depth])] : []),
    ];
  }
  const p = fromEdge(before.axes, [0, first?.cut.depth ?? 0]);
  const q = fromEdge(after.axes, [0, second?.cut.depth ?? 0]);
  const s = ((q[0] - p[0]) * v[1] - (q[1] - p[1]) * v[0]) / turn;
  const met: Vec2 = [p[0] + u[0] * s, p[1] + u[1] * s];
  const [onBefore, onAfter] = [onEdge(before.axes, met)[0], onEdge(after.axes, met)[0]];
  const lastNotch = ending && !ending.end.reaches ? ending.end.at + ending.end.relief : 0;
  const firstNotch = beginning && !beginning.start.reaches ? beginning.start.at - beginning.start.relief : after.axes.length;
  return onBefore > lastNotch + SAME_POINT_MM && onAfter < firstNotch - SAME_POINT_MM ? [met] : null;
}

/** Every strip must leave an edge of the plane part at its depth that runs the way the drawn edge does. */
function keepsOrder(plane: readonly Vec2[], ends: readonly CutWithEnds[]): boolean {
  return ends.every(({ cut, axes }) => plane.some((p, i) => {
    const [[a, h], [b, g]] = [onEdge(axes, p), onEdge(axes, plane[(i + 1) % plane.length] ?? p)];
    return Math.abs(h - cut.depth) <= SAME_POINT_MM && Math.abs(g - cut.depth) <= SAME_POINT_MM && b > a;
  }));
}
