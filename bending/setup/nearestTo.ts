import type { Interval } from "../geometry/interval";

/** The number in one of the intervals that is nearest to the one wanted; the first of equals; null when there is none. */
export function nearestTo(wanted: number, intervals: readonly Interval[]): number | null {
  let best: number | null = null;
  for (const [from, to] of intervals) {
    const near = Math.min(Math.max(wanted, from), to);
    if (best === null || Math.abs(near - wanted) < Math.abs(best - wanted) - 1e-9) best = near;
  }
  return best;
}
