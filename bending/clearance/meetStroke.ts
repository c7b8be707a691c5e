import type { Mm } from "../core/units";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { Bend } from "../part/partModel";
import { clipPrism, type Clipped } from "./clipPrism";
import type { Shape } from "./convexPiece";
import { NO_MEETING, type Meeting } from "./meeting";
import { planesFor } from "./planesFor";
import { planeGap } from "./planeGap";
import { posePrism, wingPose, type WingPose } from "./pose";
import type { Plates } from "./plates";
import type { Prism } from "./prism";

export interface StrokeQuestion {
  readonly bend: Bend;
  readonly thickness: Mm;
  readonly plates: Plates;
  readonly inFront: boolean;
  readonly shape: Shape;
  /** Height of the shape's origin over the punch's tip at half the angle. */
  readonly lift: (h: number) => number;
  /** The stroke goes from `from` to `to` (half angles) in `steps` steps in which no corner travels more than `margin`. */
  readonly from: number;
  readonly to: number;
  readonly steps: number;
  readonly margin: Mm;
  readonly count: () => void;
}

/**
 * A face's plates against a shape over a stroke. Where they stand k margins apart, the next k samples cannot touch and are
 * left out; once a plate is met over all its z-extent, only the last sample is still looked at.
 */
export function meetStroke(question: StrokeQuestion): Meeting {
  const run: Run = { question, found: [], first: Infinity, depth: 0 };
  for (const group of question.plates.groups) meetGroup(run, group);
  if (run.found.length === 0) return NO_MEETING;
  const padded = run.found.map(([from, to]): Interval => [from - question.margin, to + question.margin]);
  return { intervals: mergeIntervals(padded), strokeAngle: run.first, depth: run.depth };
}

interface Run {
  readonly question: StrokeQuestion;
  readonly found: Interval[];
  first: number;
  depth: number;
}

/** Plates that lie together: their common box is looked at first. */
function meetGroup(run: Run, { prisms, box }: Plates["groups"][number]): void {
  const { from, to, steps, bend, thickness } = run.question;
  let plates: readonly Plate[] | null = null;
  let sample = 0;
  while (sample <= steps) {
    const h = steps === 0 ? from : from + ((to - from) * sample) / steps;
    const pose = wingPose(bend, thickness, h);
    const lift = run.question.lift(h);
    const apart = boxApart(run.question, box, pose, lift);
    if (apart > 0) {
      sample += Math.max(1, Math.floor(apart / run.question.margin));
      continue;
    }
    plates ??= prisms.map((prism): Plate => ({ prism, into: new Float64Array(prism.points.length), open: run.question.shape.map(() => undefined), next: 0 }));
    let next = Infinity;
    for (const plate of plates) {
      if (plate.next <= sample) plate.next = meetPlate(run, plate, pose, h, lift, sample);
      if (plate.next < next) next = plate.next;
    }
    sample = next;
  }
  for (const { open } of plates ?? []) for (const interval of open) if (interval) run.found.push(interval);
}

interface Plate {
  readonly prism: Prism;
  readonly into: Float64Array;
  /** For each piece of the shape the z-extent met last, while it keeps growing. */
  readonly open: (Interval | undefined)[];
  /** The next sample that has to be looked at. */
  next: number;
}

function meetPlate(run: Run, plate: Plate, pose: WingPose, h: number, lift: number, sample: number): number {
  const { question } = run;
  posePrism(plate.prism.points, pose, question.inFront, plate.into);
  const apart = meetPlaced(question, plate.prism, plate.into, lift, plate.open, run.found);
  if (apart > 0) return sample + Math.max(1, Math.floor(apart / question.margin));
  if (apart < 0) {
    run.first = Math.min(run.first, 2 * h);
    run.depth = Math.max(run.depth, -apart);
  }
  const [low, high] = plate.prism.z;
  const all = plate.open.some((interval) => interval && interval[0] <= low + 1e-9 && interval[1] >= high - 1e-9);
  return all && sample < question.steps ? question.steps : sample + 1;
}

const boxInto = new Float64Array(24);

/** How far the box surely stands off every piece with its margin; 0 or less when that is not sure. */
function boxApart(question: StrokeQuestion, box: Float64Array, pose: WingPose, lift: number): number {
  posePrism(box, pose, question.inFront, boxInto);
  let apart = Infinity;
  for (const piece of question.shape) {
    apart = Math.min(apart, planeGap(boxInto, piece.withMargin, lift));
    if (apart <= 0) return 0;
  }
  return apart;
}

const clipped: Clipped = { separation: 0, from: 0, to: 0 };

/** One prism at one sample: over 0, how far it surely stands off every piece; under 0, how deep it is in (at least a trace); 0, neither. */
function meetPlaced(question: StrokeQuestion, prism: Prism, into: Float64Array, lift: number, open: (Interval | undefined)[], closed: Interval[]): number {
  let depth = 0;
  let apart = Infinity;
  for (let k = 0; k < question.shape.length; k++) {
    const piece = question.shape[k];
    if (!piece) continue;
    question.count();
    clipPrism(into, prism.count, planesFor(piece, prism, question.inFront), lift, clipped);
    if (clipped.separation < apart) apart = clipped.separation;
    if (clipped.separation > 0 || clipped.from > clipped.to) continue;
    depth = Math.max(depth, -clipped.separation, 1e-9);
    const previous = open[k];
    const joins = previous && clipped.from <= previous[1] && clipped.to >= previous[0];
    if (previous && !joins) closed.push(previous);
    open[k] = joins ? [Math.min(previous[0], clipped.from), Math.max(previous[1], clipped.to)] : [clipped.from, clipped.to];
  }
  return depth > 0 ? -depth : Math.max(0, apart);
}
