import type { Mm, Rad } from "../core/units";
import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import type { Bend } from "../part/partModel";
import { clipPrism, type Clipped } from "./clipPrism";
import type { Shape } from "./convexPiece";
import { NO_MEETING, type Meeting } from "./meeting";
import { planesFor } from "./planesFor";
import { posePrism, wingPose } from "./pose";
import type { Prism } from "./prism";

export interface StrokeQuestion {
  readonly bend: Bend;
  readonly thickness: Mm;
  readonly prisms: readonly Prism[];
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

/** A face's plates against a shape over a stroke. Where they stand k margins apart, the next k samples cannot touch and are left out. */
export function meetStroke(question: StrokeQuestion): Meeting {
  const found: Interval[] = [];
  let first = Infinity;
  let depth = 0;
  for (const prism of question.prisms) {
    const into = new Float64Array(prism.points.length);
    const open: (Interval | undefined)[] = question.shape.map(() => undefined);
    for (let sample = 0; sample <= question.steps; ) {
      const h = question.steps === 0 ? question.from : question.from + ((question.to - question.from) * sample) / question.steps;
      posePrism(prism, wingPose(question.bend, question.thickness, h), question.inFront, into);
      const met = meetPlaced(question, prism, into, question.lift(h), open, found);
      if (met.depth >= 0) {
        first = Math.min(first, 2 * h);
        depth = Math.max(depth, met.depth);
      }
      sample += Math.max(1, Math.floor(met.apart / question.margin));
    }
    for (const interval of open) if (interval) found.push(interval);
  }
  if (found.length === 0) return NO_MEETING;
  const padded = found.map(([from, to]): Interval => [from - question.margin, to + question.margin]);
  return { intervals: mergeIntervals(padded), strokeAngle: first as Rad, depth };
}

const clipped: Clipped = { separation: 0, from: 0, to: 0, depth: 0 };

/** One prism at one sample. `depth` < 0: nothing met; `apart`: how far it surely stands off every piece. */
function meetPlaced(question: StrokeQuestion, prism: Prism, into: Float64Array, lift: number, open: (Interval | undefined)[], closed: Interval[]): { readonly depth: number; readonly apart: number } {
  let depth = -1;
  let apart = Infinity;
  question.shape.forEach((piece, k) => {
    question.count();
    clipPrism(into, prism.count, planesFor(piece, prism, question.inFront), lift, clipped);
    apart = Math.min(apart, Math.max(0, clipped.separation));
    if (clipped.separation > 0 || clipped.from > clipped.to) return;
    depth = Math.max(depth, clipped.depth);
    const previous = open[k];
    const joins = previous && clipped.from <= previous[1] && clipped.to >= previous[0];
    if (previous && !joins) closed.push(previous);
    open[k] = joins ? [Math.min(previous[0], clipped.from), Math.max(previous[1], clipped.to)] : [clipped.from, clipped.to];
  });
  return { depth, apart };
}
