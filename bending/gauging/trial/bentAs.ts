import type { Hit } from "../../clearance/hit";
import type { PartModel } from "../../part/partModel";
import { bentBend } from "../bentBend";
import { opposedBend } from "../opposedBend";

/** The errors of one part, by step. */
export interface StepErrors {
  /** How far the bend line lies off in the sheet, towards the child of the step's first bend, mm. */
  readonly shift: readonly number[];
  /** How far the angles are bent over, radians. */
  readonly turn: readonly number[];
}

/** The part as it really comes out: every line where its step put it, every bend as far over as its stroke went; edges and holes stay where they were cut. */
export function bentAs(part: PartModel, steps: readonly Pick<Hit, "bends">[], errors: StepErrors): PartModel {
  const bends = [...part.bends];
  steps.forEach((step, s) => {
    for (const index of step.bends) {
      const bend = bends[index];
      if (bend) bends[index] = bentBend(bend, (errors.shift[s] ?? 0) * (opposedBend(part, step, index) ? -1 : 1), errors.turn[s] ?? 0);
    }
  });
  return { ...part, bends };
}
