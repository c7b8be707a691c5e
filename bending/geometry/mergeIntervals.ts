import type { Interval } from "./interval";

/** The union as disjoint intervals in order; those that touch or lie within `join` of one another become one. */
export function mergeIntervals(intervals: readonly Interval[], join = 0): readonly Interval[] {
  if (intervals.length < 2) return intervals;
  const sorted = [...intervals].sort((a, b) => a[0] - b[0] || a[1] - b[1]);
  const merged: [number, number][] = [];
  for (const [from, to] of sorted) {
    const last = merged[merged.length - 1];
    if (last && from <= last[1] + join) last[1] = Math.max(last[1], to);
    else merged.push([from, to]);
  }
  return merged;
}
