import type { PartModel } from "../part/partModel";
import type { GaugedStep } from "./gaugedStep";
import { angleEntry, gaugeEntry, type LinearForm } from "./linearForm";
import { stepSlopes } from "./stepSlopes";
import { gaugedDepth } from "./gaugedDepth";
import { touchedThrough } from "./touchedThrough";

/**
 * How far each step's bend line lies off in the sheet, as a sum over the errors of the steps up to it (the first bend's
 * child away from its parent counts as more). The operator brings the part against the fingers: the depth that the gauge
 * finds is the stop's own, wrong by the stop's error. From that the line follows, since moving it by 1 mm changes the depth by 1 mm;
 * bends already formed between line and fingers bring their own lines and angles in. Derived here.
 */
export function lineForms(part: PartModel, steps: readonly GaugedStep[]): readonly LinearForm[] {
  const forms: LinearForm[] = [];
  steps.forEach((step, s) => {
    const form = new Array<number>(2 * steps.length).fill(0);
    const { touch } = step;
    const depth = (bent: PartModel) => [touch === null ? 0 : gaugedDepth(bent, step, touch)];
    const childBehind = step.front === part.bends[step.bends[0] ?? -1]?.parent;
    // depth = touched place - line when the child lies behind, line - touched place when the parent does.
    const sign = childBehind ? -1 : 1;
    form[gaugeEntry(s)] = sign;
    for (const earlier of touchedThrough(part, steps, s)) {
      const slope = stepSlopes(part, steps, earlier, depth);
      const [shift = 0, turn = 0] = [slope.shift[0], slope.turn[0]];
      form[angleEntry(earlier)] = (form[angleEntry(earlier)] ?? 0) - sign * turn;
      forms[earlier]?.forEach((value, i) => { form[i] = (form[i] ?? 0) - sign * shift * value; });
    }
    forms.push(form);
  });
  return forms;
}
