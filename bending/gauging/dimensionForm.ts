import type { Frame } from "../geometry/frame";
import type { PartModel } from "../part/partModel";
import type { BendMotion } from "./bendMotion";
import { createAddDrift } from "./createAddDrift";
import { endDrift } from "./endDrift";
import type { GaugedStep } from "./gaugedStep";
import type { LinearForm } from "./linearForm";
import type { DimensionEnd, PartDimension } from "./partDimension";

/** A dimension's error as a sum over the steps' errors, between its beginnings and its ends; of several pairs the one that `badness` finds worst. `frames` as seen from its face. */
export function dimensionForm(
  part: PartModel, steps: readonly GaugedStep[], motions: readonly BendMotion[], lines: readonly LinearForm[], frames: readonly Frame[], dimension: PartDimension, badness: (form: LinearForm) => number,
): LinearForm {
  const add = createAddDrift(part, steps);
  const formsOf = (ends: readonly DimensionEnd[], way: 1 | -1) => ends.map((end) => {
    const form = new Array<number>(2 * steps.length).fill(0);
    add(form, endDrift(part, frames, motions, dimension.face, end, dimension.direction, way), way, lines);
    return form;
  });
  const [starts, ends] = [formsOf(dimension.from, -1), formsOf(dimension.to, 1)];
  let worst: LinearForm = [];
  let most = -1;
  for (const start of starts) {
    for (const end of ends) {
      const form = end.map((value, i) => value + (start[i] ?? 0));
      const bad = starts.length * ends.length === 1 ? 0 : badness(form);
      if (bad > most) [worst, most] = [form, bad];
    }
  }
  return worst;
}
