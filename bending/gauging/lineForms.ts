import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import type { PartModel } from "../part/partModel";
import type { BendMotion } from "./bendMotion";
import { createAddDrift } from "./createAddDrift";
import type { Drift } from "./drift";
import type { GaugedStep } from "./gaugedStep";
import { levelFrames } from "./levelFrames";
import { gaugeEntry, type LinearForm } from "./linearForm";
import { pointDrift } from "./pointDrift";

/**
 * How far each step's bend line lies off in the sheet, as a sum over the errors of the steps up to it (towards the first bend's
 * child counts as more). The operator brings the part against the fingers: the depth that the gauge finds is the stop's
 * own, wrong by the stop's error. From that the line follows, since moving it by 1 mm changes the depth by 1 mm; bends already formed
 * between line and fingers bring their own lines and angles in. Derived here.
 */
export function lineForms(part: PartModel, steps: readonly GaugedStep[], motions: readonly BendMotion[]): readonly LinearForm[] {
  const add = createAddDrift(part, steps);
  const forms: LinearForm[] = [];
  steps.forEach((step, s) => {
    const form = new Array<number>(2 * steps.length).fill(0);
    // depth = touched place - line when the child lies behind, line - touched place when the parent does.
    const sign = step.front === part.bends[step.bends[0] ?? -1]?.parent ? -1 : 1;
    form[gaugeEntry(s)] = sign;
    add(form, depthDrift(part, step, motions), -sign, forms);
    forms.push(form);
  });
  return forms;
}

/** How the touched place moves to the back with the bends formed between it and the line. */
function depthDrift(part: PartModel, step: GaugedStep, motions: readonly BendMotion[]): readonly Drift[] {
  const { touch } = step;
  if (touch === null) return [];
  const frames = levelFrames(part, step);
  const [bend, frame] = [part.bends[step.bends[0] ?? -1], frames[touch.face]];
  invariant(bend && frame, "the fingers touch a face of the part");
  const isFormed = (index: number) => !step.bends.includes(index) && ((step.formed >> index) & 1) === 1;
  // At a slanted edge what moves along the bed moves the crossing with the fingers as well.
  return pointDrift(part, frames, motions, isFormed, bend.parent, touch.face, applyFrame(frame, touch.point), [1, 0, -touch.slope]);
}
