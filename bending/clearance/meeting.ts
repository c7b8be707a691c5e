import type { Interval } from "../geometry/interval";

/** What a face (with its near bend zone) meets of one thing. */
export interface Meeting {
  /** z-intervals from the hit's middle, kept off by the margin; sorted, apart; empty when nothing is met. */
  readonly intervals: readonly Interval[];
  /** Angle turned through at which it is met first, and how far in the face was at the deepest sample looked at. */
  readonly strokeAngle: number;
  readonly depth: number;
}

export const NO_MEETING: Meeting = { intervals: [], strokeAngle: 0, depth: 0 };
