import type { Interval } from "./interval";
import { mergeIntervals } from "./mergeIntervals";

/** What is left of `within` when `taken` is removed, in order. */
export function freeIntervals(within: Interval, taken: readonly Interval[]): readonly Interval[] {
  const free: Interval[] = [];
  let from = within[0];
  for (const [start, end] of mergeIntervals(taken)) {
    if (end <= from) continue;
    if (start >= within[1]) break;
    if (start > from) free.push([from, start]);
    from = Math.max(from, end);
  }
  if (from < within[1]) free.push([from, within[1]]);
  return free;
}
