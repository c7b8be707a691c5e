import { SAME_POINT_MM } from "../core/tolerance";
import type { Interval } from "../geometry/interval";
import { gapOfBoxes, poseBox } from "./boxGap";
import { clipPrism, type Clipped } from "./clipPrism";
import type { ConvexPiece, Shape } from "./convexPiece";
import { planeGap } from "./planeGap";
import { outlineFor } from "./outlineFor";
import type { Plates } from "./plates";
import { posePrism } from "./posePrism";
import type { Prism } from "./prism";
import type { Question } from "./question";
import { sectionGap } from "./sectionGap";
import { POSE_NUMBERS } from "./strokeMotion";

/** What plates met: z-extents, the first sample, how deep at the deepest sample looked at. */
export interface Met {
  readonly found: Interval[];
  sample: number;
  depth: number;
}

/**
 * Plates that lie together against the pieces of a shape, over the samples `from` to `steps`. Where a plate stands k margins
 * off a piece, the next k samples cannot touch and are left out; once it is met over all its z-extent, only the last sample
 * is still looked at.
 */
export function meetPlates(question: Question, { prisms, bounds }: Plates["groups"][number], shape: Shape, poses: Float64Array, from: number, steps: number, met: Met): void {
  const { lift, onBed, margin } = question;
  const open = shape.map((piece): Open => ({ piece, next: from }));
  let plates: readonly Plate[] | null = null;
  let sample = from;
  while (sample <= steps) {
    const at = POSE_NUMBERS * sample;
    const raised = onBed ? lift - (poses[at + 4] as number) : lift;
    let next = Infinity;
    let near = false;
    poseBox(poses, at, bounds, posed);
    for (const one of open) {
      if (one.next <= sample) {
        const gap = Math.max(gapOfBoxes(posed, one.piece.box, raised), planeGap(poses, at, bounds, one.piece.withMargin.planes, raised));
        if (gap <= 0) near = true;
        else one.next = sample + Math.max(1, Math.floor(gap / margin));
      }
      if (one.next < next) next = one.next;
    }
    if (!near) {
      sample = next;
      continue;
    }
    plates ??= prisms.map((prism): Plate => ({ prism, pieces: shape.map(() => ({ next: 0, extent: null })), next: 0 }));
    next = Infinity;
    for (const plate of plates) {
      if (plate.next <= sample) meetPlate(question, plate, open, poses, sample, steps, raised, met);
      if (plate.next < next) next = plate.next;
    }
    sample = Math.max(sample + 1, next);
  }
  for (const plate of plates ?? []) for (const { extent } of plate.pieces) if (extent) met.found.push(extent);
}

/** A piece, and the next sample at which the box round the plates can be near it. */
interface Open { readonly piece: ConvexPiece; next: number }

interface Plate {
  readonly prism: Prism;
  /** For each piece of the shape the next sample to look at, and the z-extent met last, while it keeps growing. */
  readonly pieces: { next: number; extent: Interval | null }[];
  next: number;
}

const posed = new Float64Array(4);
const clipped: Clipped = { separation: 0, from: 0, to: 0 };
let placed = new Float64Array(3 * 64);

function meetPlate(question: Question, plate: Plate, open: readonly Open[], poses: Float64Array, sample: number, steps: number, lift: number, met: Met): void {
  const { prism } = plate;
  const [low, high] = prism.z;
  let posed = false;
  let covered = false;
  plate.next = Infinity;
  for (let k = 0; k < open.length; k++) {
    const one = plate.pieces[k];
    const { piece, next } = open[k] as Open;
    if (!one) continue;
    one.next = Math.max(one.next, next);
    if (one.next <= sample) {
      question.counts.clips++;
      const outline = outlineFor(piece, prism.lies);
      if (prism.section) {
        clipped.separation = sectionGap(prism.section, poses, POSE_NUMBERS * sample, outline, lift);
        clipped.from = low;
        clipped.to = high;
      } else {
        if (!posed) {
          if (placed.length < prism.points.length) placed = new Float64Array(prism.points.length);
          posePrism(prism.points, poses, POSE_NUMBERS * sample, false, placed);
          posed = true;
        }
        clipPrism(placed, prism.count, outline.planes, lift, clipped);
      }
      one.next = sample + 1;
      if (clipped.separation > -SAME_POINT_MM) one.next = sample + Math.max(1, Math.floor(clipped.separation / question.margin));
      else if (clipped.from <= clipped.to) {
        met.sample = Math.min(met.sample, sample);
        met.depth = Math.max(met.depth, -clipped.separation, 1e-9);
        const { extent } = one;
        const joins = extent && clipped.from <= extent[1] && clipped.to >= extent[0];
        if (extent && !joins) met.found.push(extent);
        one.extent = joins ? [Math.min(extent[0], clipped.from), Math.max(extent[1], clipped.to)] : [clipped.from, clipped.to];
        covered ||= one.extent[0] <= low + 1e-9 && one.extent[1] >= high - 1e-9;
      }
    }
    if (one.next < plate.next) plate.next = one.next;
  }
  if (!covered) return;
  const last = sample < steps ? steps : steps + 1;
  plate.next = last;
  for (const one of plate.pieces) one.next = last;
}
