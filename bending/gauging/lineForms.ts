import type { PartModel } from "../part/partModel";
import type { BendMotion } from "./bendMotion";
import { createAddDrift } from "./createAddDrift";
import { depthDrift } from "./depthDrift";
import type { GaugedStep } from "./gaugedStep";
import { gaugeEntry, type LinearForm } from "./linearForm";

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
