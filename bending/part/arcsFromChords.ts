import { ARC_CHORD_MM, SAME_POINT_MM } from "../core/tolerance";
import type { Vec2 } from "../geometry/vec2";
import type { BulgeVertex, FlatCircle } from "./partModel";

/**
 * A closed outline with the arcs given back where chords stand for them: two or more edges in a row whose ends lie on
 * one of the circles. An arc of more than half a turn is given as two.
 */
export function arcsFromChords(outline: readonly Vec2[], circles: readonly FlatCircle[]): readonly BulgeVertex[] {
  const n = outline.length;
  const at = (i: number): Vec2 => outline[((i % n) + n) % n] ?? [0, 0];
  const boxes = circles.map(({ centre: [x, y], radius }) => [x - radius - 1, x + radius + 1, y - radius - 1, y + radius + 1] as const);
  const on = outline.map((p, i) => (circles.length === 0 ? -1 : circles.findIndex((circle, c) => {
    const box = boxes[c];
    return box && p[0] > box[0] && p[0] < box[1] && p[1] > box[2] && p[1] < box[3] && isChord(circle, p, at(i + 1));
  })));
  const same = (i: number, j: number) => {
    const [a, b] = [on[((i % n) + n) % n] ?? -1, on[((j % n) + n) % n] ?? -1];
    const circle = circles[a];
    return circle !== undefined && a === b && turn(circle, at(i), at(i + 1)) * turn(circle, at(j), at(j + 1)) > 0;
  };
  const start = outline.findIndex((_, i) => !same(i - 1, i));
  const vertices: BulgeVertex[] = [];
  for (let k = 0; k < n; ) {
    const first = (start < 0 ? 0 : start) + k;
    let length = 1;
    while (length < n - k && same(first + length - 1, first + length)) length++;
    const circle = circles[on[first % n] ?? -1];
    if (length === 1 || !circle) vertices.push([...at(first), 0]);
    else for (const [from, to] of halves(circle, at, first, length)) vertices.push([...at(from), Math.tan(sweep(circle, at, from, to) / 4)]);
    k += length;
  }
  return vertices;
}

type At = (i: number) => Vec2;

function isChord({ centre, radius }: FlatCircle, p: Vec2, q: Vec2): boolean {
  const off = (r: Vec2) => Math.hypot(r[0] - centre[0], r[1] - centre[1]) - radius;
  const close = SAME_POINT_MM * Math.max(1, radius * 1e-3);
  return Math.abs(off(p)) < close && Math.abs(off(q)) < close && -off([(p[0] + q[0]) / 2, (p[1] + q[1]) / 2]) <= ARC_CHORD_MM + close;
}

/** Angle from p to q as seen from the centre; chords turn through less than half a turn. */
function turn({ centre }: FlatCircle, p: Vec2, q: Vec2): number {
  const [ax, ay, bx, by] = [p[0] - centre[0], p[1] - centre[1], q[0] - centre[0], q[1] - centre[1]];
  return Math.atan2(ax * by - ay * bx, ax * bx + ay * by);
}

function sweep(circle: FlatCircle, at: At, from: number, to: number): number {
  let sum = 0;
  for (let i = from; i < to; i++) sum += turn(circle, at(i), at(i + 1));
  return sum;
}

function halves(circle: FlatCircle, at: At, first: number, length: number): readonly (readonly [number, number])[] {
  if (Math.abs(sweep(circle, at, first, first + length)) <= Math.PI + SAME_POINT_MM) return [[first, first + length]];
  const middle = first + Math.floor(length / 2);
  return [[first, middle], [middle, first + length]];
}
