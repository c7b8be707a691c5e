import type { Interval } from "./interval";

/** What two lists of disjoint, ordered intervals have in common; a shared single point counts. */
export function intersectIntervals(a: readonly Interval[], b: readonly Interval[]): readonly Interval[] {
  const common: Interval[] = [];
  let i = 0;
  let j = 0;
  for (let p = a[i], q = b[j]; p && q; p = a[i], q = b[j]) {
    const from = Math.max(p[0], q[0]);
    const to = Math.min(p[1], q[1]);
    if (from <= to) common.push([from, to]);
    if (p[1] < q[1]) i++;
    else j++;
  }
  return common;
}
