import { freeIntervals } from "./freeIntervals";
import type { Interval } from "./interval";

/** The longest piece of `within` that `taken` leaves free (the first of equals), or null when none is left. */
export function longestFreeInterval(within: Interval, taken: readonly Interval[]): Interval | null {
  let best: Interval | null = null;
  for (const piece of freeIntervals(within, taken)) {
    if (!best || piece[1] - piece[0] > best[1] - best[0]) best = piece;
  }
  return best;
}
