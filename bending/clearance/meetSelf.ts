import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { Mm } from "../core/units";
import { NO_MEETING, type Meeting } from "./meeting";
import { posePrism } from "./posePrism";
import type { Prism } from "./prism";
import { prismGap } from "./prismGap";
import { POSE_NUMBERS, type StrokeMotion } from "./strokeMotion";

export interface SelfQuestion {
  /** The stroke to the finished angle. */
  readonly motion: StrokeMotion;
  /** Are the two faces joined by the bend in the making? */
  readonly neighbours: boolean;
  /** Plates of a face in front and of one at the back, each in its own half's coordinates, in the state of the moment. */
  readonly front: readonly Prism[];
  readonly back: readonly Prism[];
  /** The same in the finished part. */
  readonly finished: () => { readonly front: readonly Prism[]; readonly back: readonly Prism[] };
  /** Equal steps in which no two corners near each other by more than `margin`. */
  readonly steps: number;
  readonly margin: Mm;
}

/** Up to so many margins a gap is measured exactly where their boxes do not settle it. */
const EXACT_MARGINS = 4;

/**
 * Two faces on the two sides of a stroke, from flat to the finished angle. The margin holds, unless the faces are nearer by
 * design: in the finished part, or before the stroke; then they may come as near as that (an overlap by design, as of
 * neighbours in a corner that was drawn closed, within `MEANT_CONTACT_MM`). A flange and the face that it is bent from hang
 * together and move in the same way in every order: they pass as near as they were drawn, and only may not enter each other.
 */
export function meetSelf(question: SelfQuestion): Meeting {
  const { front, back, margin } = question;
  const [turned, backZ] = [extent(front), extent(back)];
  const frontZ = [-turned[1], -turned[0]] as const;
  const strictest = question.neighbours ? -MEANT_CONTACT_MM : margin - MEANT_CONTACT_MM;
  if (Math.max(backZ[0] - frontZ[1], frontZ[0] - backZ[1]) >= strictest) return NO_MEETING;
  const pair: Placed = { front: placed(front), back: placed(back) };
  if (!question.neighbours && nearest(question, pair, strictest) === null) return NO_MEETING;
  const met = nearest(question, pair, question.neighbours ? strictest : nearestByDesign(question, pair));
  if (met === null) return NO_MEETING;
  const [from, to] = [Math.max(frontZ[0], backZ[0]), Math.min(frontZ[1], backZ[1])];
  return { intervals: [from <= to ? [from, to] : [to, from]], ...met };
}

/** How near the faces are by design, at most the margin. */
function nearestByDesign(question: SelfQuestion, pair: Placed): number {
  const finished = question.finished();
  const drawn = gapAt(question, { front: placed(finished.front), back: placed(finished.back) }, question.steps, question.margin);
  const before = gapAt(question, pair, 0, question.margin);
  return Math.max(0, Math.min(drawn, before, question.margin)) - MEANT_CONTACT_MM;
}

/** Where the faces come nearer than wanted first, and by how much at the most; null when they do not. */
function nearest(question: SelfQuestion, pair: Placed, wanted: number): { readonly strokeAngle: number; readonly depth: number } | null {
  const { motion, steps, margin } = question;
  let depth = 0;
  let first = Infinity;
  for (let sample = 0; sample <= steps; ) {
    const gap = gapAt(question, pair, sample, wanted + EXACT_MARGINS * margin);
    if (gap < wanted) {
      first = Math.min(first, motion.angle(sample, steps));
      depth = Math.max(depth, wanted - gap);
    }
    sample += Math.max(1, Math.floor((gap - wanted) / margin));
  }
  return first === Infinity ? null : { strokeAngle: first, depth };
}

interface PlacedPrism { readonly prism: Prism; readonly into: Float64Array }
interface Placed { readonly front: readonly PlacedPrism[]; readonly back: readonly PlacedPrism[] }

const placed = (prisms: readonly Prism[]): readonly PlacedPrism[] => prisms.map((prism) => ({ prism, into: new Float64Array(prism.points.length) }));

/** A gap that the faces surely have: exact up to `enough`; over that, what their boxes leave or `enough` at the least. */
function gapAt({ motion, steps }: SelfQuestion, { front, back }: Placed, sample: number, enough: number): number {
  const poses = motion.poses(steps);
  for (const { prism, into } of front) posePrism(prism.points, poses, POSE_NUMBERS * sample, true, into);
  for (const { prism, into } of back) posePrism(prism.points, poses, POSE_NUMBERS * sample, false, into);
  const boxes = boxGap(front, back);
  if (boxes >= enough) return boxes;
  let least = enough;
  for (const one of front) for (const other of back) least = Math.min(least, prismGap(one.into, one.prism.count, other.into, other.prism.count, least));
  return Math.max(least, boxes);
}

function boxGap(front: readonly PlacedPrism[], back: readonly PlacedPrism[]): number {
  let widest = -Infinity;
  for (let axis = 0; axis < 3; axis++) {
    const [low, high] = [rangeOf(front, axis), rangeOf(back, axis)];
    widest = Math.max(widest, high[0] - low[1], low[0] - high[1]);
  }
  return widest;
}

function rangeOf(prisms: readonly PlacedPrism[], axis: number): readonly [number, number] {
  let [low, high] = [Infinity, -Infinity];
  for (const { into } of prisms) {
    for (let i = axis; i < into.length; i += 3) {
      const value = into[i] as number;
      if (value < low) low = value;
      if (value > high) high = value;
    }
  }
  return [low, high];
}

function extent(prisms: readonly Prism[]): readonly [number, number] {
  return [Math.min(...prisms.map((prism) => prism.z[0])), Math.max(...prisms.map((prism) => prism.z[1]))];
}
