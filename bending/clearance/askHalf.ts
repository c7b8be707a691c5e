import { mergeIntervals } from "../geometry/mergeIntervals";
import { turnIntervals } from "../geometry/turnIntervals";
import type { FaceState, HalfAnswer, HalfState } from "./half";
import { meetFace } from "./meetFace";
import type { Meeting } from "./meeting";
import type { Question } from "./question";

export const NOTHING: HalfAnswer = { back: [], front: [] };

/**
 * Where the question's thing must not stand because of a half. A face that lies within what nearer faces forbid is not looked
 * at, unless it might forbid more than its own extent.
 */
export function askHalf(question: Question, state: HalfState): HalfAnswer {
  const known = state.answers[question.index];
  if (known) return known;
  const before = state.before ? askHalf(question, state.before) : NOTHING;
  const answer = withFace(question, before, state.last);
  state.answers[question.index] = answer;
  return answer;
}

function withFace(question: Question, before: HalfAnswer, face: FaceState): HalfAnswer {
  if (before !== NOTHING && !question.everywhere?.pieces.length) {
    const { z } = face.bounds();
    if (before.back.some(([from, to]) => from <= z[0] - question.margin && to >= z[1] + question.margin)) return before;
  }
  const { intervals } = askFace(question, face);
  if (intervals.length === 0) return before;
  const back = before === NOTHING ? intervals : mergeIntervals([...before.back, ...intervals]);
  return { back, front: turnIntervals(back) };
}

/** What one face meets, answered once. */
export function askFace(question: Question, face: FaceState): Meeting {
  const known = face.meetings[question.index];
  if (known) return known;
  question.counts.entries++;
  return (face.meetings[question.index] = meetFace(question, face));
}

/** The nearest face that meets anything; null when none does. */
export function nearestMet(question: Question, state: HalfState): FaceState | null {
  if (askHalf(question, state) === NOTHING) return null;
  let first = state;
  while (first.before && first.before.answers[question.index] !== NOTHING) first = first.before;
  return first.last;
}

