import type { Interval } from "./interval";

/** Intervals along a line that is turned end for end about 0; ordered ones stay ordered. */
export function turnIntervals(intervals: readonly Interval[]): readonly Interval[] {
  return intervals.map(([from, to]): Interval => [-to, -from]).reverse();
}
