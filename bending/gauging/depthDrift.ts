import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { turnByFrame } from "../geometry/turnByFrame";
import { bendDirections } from "../part/bendDirections";
import type { PartModel } from "../part/partModel";
import type { BendMotion } from "./bendMotion";
import type { Drift } from "./drift";
import type { GaugedStep } from "./gaugedStep";
import { levelFrames } from "./levelFrames";
import { pointDrift } from "./pointDrift";

/** How the touched place moves to the back with the bends formed between it and the line. */
export function depthDrift(part: PartModel, step: GaugedStep, motions: readonly BendMotion[]): readonly Drift[] {
  const { touch } = step;
  if (touch === null) return [];
  const frames = levelFrames(part, step);
  const [bend, frame] = [part.bends[step.bends[0] ?? -1], frames[touch.face]];
  invariant(bend && frame, "the fingers touch a face of the part");
  const isFormed = (index: number) => !step.bends.includes(index) && ((step.formed >> index) & 1) === 1;
  // At a slanted edge what moves along the bed moves the crossing with the fingers as well.
  const drift = pointDrift(part, frames, motions, isFormed, bend.parent, touch.face, applyFrame(frame, touch.point), [1, 0, -touch.slope]);
  const hem = touch.fold === undefined ? undefined : part.bends[touch.fold];
  if (touch.fold === undefined || !hem) return drift;
  const [x, y] = bendDirections(hem).outward;
  return [...drift, { bend: touch.fold, shift: turnByFrame(frame, [x, y, 0])[0], turn: 0 }];
}
