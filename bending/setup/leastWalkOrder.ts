import { invariant } from "../core/invariant";

/** Up to so many stations are ordered exactly: work and memory double with each. */
export const MOST_ORDERED = 12;

/**
 * The order of stations from left to right with the least walking for strokes made at them one after the other, the same room between all
 * neighbours. What is walked over a gap is its length times the count of walks that cross it, and which walks cross it hangs only on
 * the set of stations to its left; so the best order of every set, by its last station, gives the best of all. Exact; of
 * equals the one that comes first. After the cut argument of minimum linear arrangement (from memory).
 *
 * `lengths`: of the stations, mm. `strokes`: the station of each stroke in turn. At most `MOST_ORDERED` stations.
 */
export function leastWalkOrder(lengths: readonly number[], gap: number, strokes: readonly number[]): readonly number[] {
  const count = lengths.length;
  invariant(count <= MOST_ORDERED, "no more stations than can be ordered");
  if (count < 2) return lengths.map((_, index) => index);
  const walks = strokes.slice(1).flatMap((to, index) => (to === strokes[index] ? [] : [[strokes[index] ?? to, to] as const]));
  const crossing = (left: number) => walks.filter(([from, to]) => ((left >> from) & 1) !== ((left >> to) & 1)).length;
  const all = 2 ** count - 1;
  const least = new Float64Array((all + 1) * count).fill(Infinity);
  const before = new Int8Array((all + 1) * count).fill(-1);
  for (let first = 0; first < count; first += 1) least[(1 << first) * count + first] = 0;
  for (let left = 1; left < all; left += 1) {
    const crossed = crossing(left);
    for (let last = 0; last < count; last += 1) {
      const walked = least[left * count + last] ?? Infinity;
      if (walked === Infinity) continue;
      for (let next = 0; next < count; next += 1) {
        if ((left >> next) & 1) continue;
        const at = (left | (1 << next)) * count + next;
        const more = walked + crossed * (((lengths[last] ?? 0) + (lengths[next] ?? 0)) / 2 + gap);
        if (more < (least[at] ?? Infinity) - 1e-9) [least[at], before[at]] = [more, last];
      }
    }
  }
  let [left, last] = [all, 0];
  for (let station = 1; station < count; station += 1) if ((least[all * count + station] ?? Infinity) < (least[all * count + last] ?? Infinity) - 1e-9) last = station;
  const order: number[] = [];
  while (last >= 0) {
    order.unshift(last);
    const previous = before[left * count + last] ?? -1;
    left &= ~(1 << last);
    last = previous;
  }
  return order;
}
