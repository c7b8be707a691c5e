import type { Interval } from "../geometry/interval";
import { mergeIntervals } from "../geometry/mergeIntervals";
import { boxGap, poseBox } from "./boxGap";
import type { FaceState } from "./half";
import { NO_MEETING, type Meeting } from "./meeting";
import { meetPlates, type Met } from "./meetPlates";
import type { PlacedShape } from "./placedShape";
import { EVERYWHERE, type Question } from "./question";
import { POSE_NUMBERS } from "./strokeMotion";

/** What one face meets: see `Question`. While the box round it stands k margins off the box round the shape, k samples are left out. */
export function meetFace(question: Question, face: FaceState): Meeting {
  if (question.everywhere) {
    const anywhere = meetShape(question, face, question.everywhere);
    if (anywhere !== NO_MEETING) return { ...anywhere, intervals: [EVERYWHERE] };
  }
  return question.shape.pieces.length === 0 ? NO_MEETING : meetShape(question, face, question.shape);
}

const posed = new Float64Array(4);

function meetShape(question: Question, face: FaceState, shape: PlacedShape): Meeting {
  const { motion, lift, onBed, margin } = question;
  const bounds = face.bounds();
  const steps = motion.steps(bounds);
  const poses = motion.poses(steps);
  let sample = 0;
  while (sample <= steps) {
    const at = POSE_NUMBERS * sample;
    poseBox(poses, at, bounds, posed);
    const gap = boxGap(posed, shape, onBed ? lift - (poses[at + 4] as number) : lift);
    if (gap <= 0) break;
    sample += Math.max(1, Math.floor(gap / margin));
  }
  if (sample > steps) return NO_MEETING;
  const met: Met = { found: [], sample: Infinity, depth: 0 };
  for (const group of face.plates().groups) meetPlates(question, group, shape.pieces, poses, sample, steps, met);
  if (met.found.length === 0) return NO_MEETING;
  const padded = met.found.map(([from, to]): Interval => [from - margin, to + margin]);
  return { intervals: mergeIntervals(padded), strokeAngle: motion.angle(met.sample, steps), depth: met.depth };
}
