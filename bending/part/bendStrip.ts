import type { FieldProblem } from "../core/problem";
import { fail, ok, type Result } from "../core/result";
import type { LengthUnit } from "../core/units";
import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";
import { edgeAxes, fromEdge, onEdge, type EdgeAxes } from "./edgeCut";
import { formatLength } from "../core/formatLength";

/** Drawings often end a bend line short of the sheet's edge; it must cover this part of the sheet, so that no tab is meant. */
const LEAST_COVER = 0.8;
/** An end of the zone has to be one straight edge; arcs are taken as straight there when they are by this much (mm). */
const STRAIGHT_MM = 0.05;

/** The zone of a bend on a drawn flat: all the way across the sheet, half the allowance to each side of its line. */
export interface BendStrip {
  /** Along the drawn line; inward is its left. */
  readonly axes: EdgeAxes;
  readonly half: number;
  /** Where the sheet is, along the line, on the right border, on the line itself and on the left border. */
  readonly right: Interval;
  readonly middle: Interval;
  readonly left: Interval;
}

export function bendStrip(
  outline: readonly Vec2[], line: readonly [Vec2, Vec2], allowance: number, path: string, units: LengthUnit,
): Result<BendStrip, FieldProblem> {
  const axes = edgeAxes({ from: line[0], to: line[1] });
  const half = allowance / 2;
  const local = outline.map((p) => onEdge(axes, p));
  const at = (depth: number) => sheetAt(local, axes.length / 2, depth);
  const [right, middle, left] = [at(-half), at(0), at(half)];
  if (!middle) return fail({ path, message: "the bend line must lie on the sheet" });
  const covered = Math.min(middle[1], axes.length) - Math.max(middle[0], 0);
  if (covered < LEAST_COVER * (middle[1] - middle[0])) {
    return fail({ path, message: `the bend line must run from edge to edge: it is ${formatLength(axes.length, units)} long, the sheet along it ${formatLength(middle[1] - middle[0], units)}` });
  }
  if (!right || !left) return fail({ path, message: `the bend line is too near the edge: the bend takes ${formatLength(half, units)} on each side of it` });
  for (const end of [0, 1] as const) {
    const straight = Math.abs((right[end] + left[end]) / 2 - middle[end]) <= STRAIGHT_MM;
    const corner = local.some(([a, h]) => Math.abs(h) < half - STRAIGHT_MM && Math.abs(a - middle[end]) < half && !onSide(a, h, right[end], left[end], half));
    if (!straight || corner) return fail({ path, message: `the outline has a corner within the bend, which reaches ${formatLength(half, units)} to each side of the line; move the corner or the line` });
  }
  return ok({ axes, half, right, middle, left });
}

function onSide(a: number, h: number, right: number, left: number, half: number): boolean {
  return Math.abs(right + ((left - right) * (h + half)) / (2 * half) - a) <= STRAIGHT_MM;
}

/** The stretch of the sheet round `along` on the line that runs `depth` to the left. */
function sheetAt(local: readonly Vec2[], along: number, depth: number): Interval | null {
  const crossings: number[] = [];
  local.forEach((p, i) => {
    const q = local[(i + 1) % local.length] ?? p;
    if (p[1] > depth !== q[1] > depth) crossings.push(p[0] + ((depth - p[1]) * (q[0] - p[0])) / (q[1] - p[1]));
  });
  crossings.sort((a, b) => a - b);
  const next = crossings.findIndex((value) => value > along);
  const [from, to] = [crossings[next - 1], crossings[next]];
  return next % 2 === 1 && from !== undefined && to !== undefined ? [from, to] : null;
}

/** The strip's corners on the sheet, its ends moved out by `beyond`: right border start and end, left border end and start. */
export function stripCorners({ axes, half, right, left }: BendStrip, beyond = 0): readonly [Vec2, Vec2, Vec2, Vec2] {
  return [
    fromEdge(axes, [right[0] - beyond, -half]), fromEdge(axes, [right[1] + beyond, -half]),
    fromEdge(axes, [left[1] + beyond, half]), fromEdge(axes, [left[0] - beyond, half]),
  ];
}
