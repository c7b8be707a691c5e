import type { PartModel } from "../part/partModel";
import { bentAs } from "./bentAs";
import type { GaugedStep } from "./gaugedStep";

/** mm and radians. Half-widths of the central differences: their error is under 1e-7 of a millimetre a radian for a metre of lever. */
const SHIFT = 0.01;
const TURN = 1e-4;

export interface Slopes {
  /** Change a millimetre that the step's bend line lies off. */
  readonly shift: readonly number[];
  /** Change a radian that the step's bends are over. */
  readonly turn: readonly number[];
}

/** How sizes of the part change with one step's errors: the exact model, bent a little too far either way. */
export function stepSlopes(part: PartModel, steps: readonly Pick<GaugedStep, "bends">[], step: number, sizes: (bent: PartModel) => readonly number[]): Slopes {
  const only = (value: number): readonly number[] => steps.map((_, s) => (s === step ? value : 0));
  const none = only(0);
  const difference = (over: PartModel, under: PartModel, width: number): readonly number[] => {
    const low = sizes(under);
    return sizes(over).map((high, i) => (high - (low[i] ?? 0)) / (2 * width));
  };
  return {
    shift: difference(bentAs(part, steps, { shift: only(SHIFT), turn: none }), bentAs(part, steps, { shift: only(-SHIFT), turn: none }), SHIFT),
    turn: difference(bentAs(part, steps, { shift: none, turn: only(TURN) }), bentAs(part, steps, { shift: none, turn: only(-TURN) }), TURN),
  };
}
