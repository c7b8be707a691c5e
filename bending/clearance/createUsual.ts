import { askFace } from "./askHalf";
import type { HalfState } from "./half";
import type { Question } from "./question";
import { surelyClear } from "./surelyClear";

/** Does a half meet nothing at all of what it is usually asked? */
export type Usual = (state: HalfState) => boolean;

/**
 * The questions of one motion about punch, die, ram and bed, put together: most states of most faces are far from
 * everything, which boxes tell at once.
 */
export function createUsual(questions: readonly Question[]): Usual {
  const faces: boolean[] = [];
  const states: boolean[] = [];
  const usual = (state: HalfState): boolean => {
    const known = states[state.index];
    if (known !== undefined) return known;
    const { last, before } = state;
    const found = (before === null || usual(before))
      && (faces[last.index] ??= surelyClear(questions, last) || questions.every((question) => askFace(question, last).intervals.length === 0));
    states[state.index] = found;
    return found;
  };
  return usual;
}
