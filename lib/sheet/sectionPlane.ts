import { applyFrame } from "@/bending/geometry/applyFrame";
import type { PlanModel, StepModel } from "./planModel";
import type { StrokeMoment } from "./stepFrames";

/** Where along the bed the step is cut to be drawn: the middle of the longest bend of the hit. */
export function sectionPlane(model: PlanModel, step: StepModel, moment: StrokeMoment): number {
  const spans = step.hit.bends.flatMap((index) => {
    const bend = model.part.bends[index];
    const frame = bend && moment.frames[bend.parent];
    if (!bend || !frame) return [];
    const ends = bend.line.map(([x, y]) => applyFrame(frame, [x, y, 0])[2]);
    return [{ middle: ((ends[0] ?? 0) + (ends[1] ?? 0)) / 2, length: Math.abs((ends[0] ?? 0) - (ends[1] ?? 0)) }];
  });
  const longest = spans.reduce((best, span) => (span.length > best.length ? span : best), { middle: 0, length: -1 });
  return longest.length < 0 ? (step.bendZ[0] + step.bendZ[1]) / 2 : longest.middle;
}
