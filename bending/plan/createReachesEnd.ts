import type { KindClass } from "./kindClasses";
import type { Situation } from "./situation";

/** Answers whether stations of these classes, each alone on the bed, can make the whole part in some order: a cheap look before any search. */
export function createReachesEnd({ moves, part }: Situation, sets: readonly number[], words: number): (classes: readonly KindClass[]) => boolean {
  const full = 2 ** part.bends.length - 1;
  const place = new Map(sets.map((set, index) => [set, index]));
  const masks = moves.map(({ mask }) => mask);
  const reached = new Uint8Array(sets.length);
  return (classes) => {
    reached.fill(0);
    const start = place.get(0);
    if (start === undefined) return full === 0;
    reached[start] = 1;
    for (let at = start; at < sets.length; at += 1) {
      if (reached[at] === 0) continue;
      for (let word = 0; word < words; word += 1) {
        let bits = 0;
        for (const { can } of classes) bits |= can[at * words + word] ?? 0;
        while (bits !== 0) {
          const bit = 31 - Math.clz32(bits);
          bits &= ~(1 << bit);
          const next = (sets[at] ?? 0) | (masks[word * 32 + bit] ?? 0);
          if (next === full) return true;
          const to = place.get(next);
          if (to !== undefined) reached[to] = 1;
        }
      }
    }
    return false;
  };
}
