import type { Bend, PartModel } from "../part/partModel";
import type { OrderMove } from "./orderProblem";
import { poseOf } from "./pose";

/** One stroke that a part allows: the bends it forms and the face on the operator's side. */
export interface Move extends OrderMove {
  /** Bend indices, ascending. */
  readonly bends: readonly number[];
  /** Index of the face next to the (first) bend line on the operator's side. */
  readonly front: number;
  /** Ends of the line over all bends of the stroke, mm along the line from the middle. */
  readonly halfLength: number;
  /** Sheet that is really bent, mm: the sum of the bends' own lengths. */
  readonly bentLength: number;
}

/** mm. Bend lines nearer than this lie on one line: the sheet's own position is not known better at the gauge. */
const SAME_LINE_MM = 0.01;
/** Radians. Finished angles nearer than this are formed by one stroke: a thousandth of a degree. */
const SAME_ANGLE = 1.75e-5;

/**
 * Every stroke of a part, both fronts of each. Bends on one line of one face, with the same angle, direction
 * and radius, may share a stroke, all of them together or one by one.
 */
export function collectMoves(part: PartModel): readonly Move[] {
  const groups: number[][] = [];
  part.bends.forEach((bend, index) => {
    const group = groups.find(([first]) => first !== undefined && sharesLine(part.bends[first], bend));
    if (group) group.push(index);
    else groups.push([index]);
  });
  const hits = groups.flatMap((group) => (group.length > 1 ? [group, ...group.map((bend) => [bend])] : [group]));
  return hits.flatMap((bends) => [moveOf(part, bends, "parent"), moveOf(part, bends, "child")]);
}

function sharesLine(a: Bend | undefined, b: Bend): boolean {
  if (a === undefined || a.parent !== b.parent || a.direction !== b.direction || a.hem !== b.hem) return false;
  if (Math.abs(a.angle - b.angle) > SAME_ANGLE || Math.abs(a.insideRadius - b.insideRadius) > SAME_LINE_MM) return false;
  if (Math.abs(a.allowance - b.allowance) > SAME_LINE_MM) return false;
  const [start, end] = a.line;
  const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
  const [dx, dy] = [(end[0] - start[0]) / length, (end[1] - start[1]) / length];
  const off = (p: readonly [number, number]) => Math.abs((p[0] - start[0]) * dy - (p[1] - start[1]) * dx);
  const along = (b.line[1][0] - b.line[0][0]) * dx + (b.line[1][1] - b.line[0][1]) * dy;
  return along > 0 && off(b.line[0]) < SAME_LINE_MM && off(b.line[1]) < SAME_LINE_MM;
}

function moveOf(part: PartModel, bends: readonly number[], front: "parent" | "child"): Move {
  const found = bends.map((index) => part.bends[index]).filter((bend): bend is Bend => bend !== undefined);
  const first = found[0];
  if (first === undefined) throw new Error("invariant: a stroke forms at least one bend");
  const [start, end] = first.line;
  const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
  const [dx, dy] = [(end[0] - start[0]) / length, (end[1] - start[1]) / length];
  const stations = found.flatMap((bend) => bend.line.map((p) => (p[0] - start[0]) * dx + (p[1] - start[1]) * dy));
  const halfLength = (Math.max(...stations) - Math.min(...stations)) / 2;
  const bentLength = found.reduce((sum, { line: [p, q] }) => sum + Math.hypot(q[0] - p[0], q[1] - p[1]), 0);
  const up = first.direction === "up" ? 1 : -1;
  const away = front === "parent" ? 1 : -1;
  return {
    bends,
    mask: bends.reduce((mask, bend) => mask | (1 << bend), 0),
    front: front === "parent" ? first.parent : first.child,
    pose: poseOf(up, away * dy, -away * dx),
    halfLength,
    bentLength,
    ...(first.hem === null ? {} : { strokes: 2 }),
  };
}
