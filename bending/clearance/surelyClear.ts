import { boxGap, poseBox } from "./boxGap";
import type { FaceState } from "./half";
import type { Question } from "./question";
import { POSE_NUMBERS } from "./strokeMotion";

const posed = new Float64Array(4);

/** Do boxes alone tell that a face meets nothing of what is asked? All questions are of one motion (a stroke seen from the die, or the part at rest) but may be seen from the punch. */
export function surelyClear(questions: readonly Question[], face: FaceState): boolean {
  const bounds = face.bounds();
  let steps = 0;
  let motion = questions[0]?.motion;
  for (const question of questions) {
    steps = Math.max(steps, question.motion.steps(bounds));
    if (question.onBed) motion = question.motion;
  }
  if (!motion) return true;
  const poses = motion.poses(steps);
  const margin = questions[0]?.margin ?? 1;
  let sample = 0;
  while (sample <= steps) {
    const at = POSE_NUMBERS * sample;
    poseBox(poses, at, bounds, posed);
    let least = Infinity;
    for (let i = 0; i < questions.length; i++) {
      const { shape, everywhere, lift, onBed } = questions[i] as Question;
      const raised = onBed ? lift - (poses[at + 4] as number) : lift;
      least = Math.min(least, boxGap(posed, shape, raised), everywhere ? boxGap(posed, everywhere, raised) : Infinity);
      if (least <= 0) return false;
    }
    sample += Math.max(1, Math.floor(least / margin));
  }
  return true;
}
