/** Draws that can be repeated from a number. */
export interface Random {
  /** Evenly in [from, to). */
  number(from: number, to: number): number;
  /** Whole, both ends included. */
  whole(from: number, to: number): number;
  chance(share: number): boolean;
  pick<T>(list: readonly T[]): T;
}

/** A counter stirred by multiply and xor-shift (the finaliser of MurmurHash3, Appleby 2011, public domain): good enough to choose cases. */
export function createRandom(seed: number): Random {
  let counter = (seed * 2654435761) >>> 0;
  const next = (): number => {
    counter = (counter + 0x9e3779b9) >>> 0;
    let x = counter;
    x = Math.imul(x ^ (x >>> 16), 0x85ebca6b);
    x = Math.imul(x ^ (x >>> 13), 0xc2b2ae35);
    return ((x ^ (x >>> 16)) >>> 0) / 4294967296;
  };
  return {
    number: (from, to) => from + (to - from) * next(),
    whole: (from, to) => from + Math.floor(next() * (to - from + 1)),
    chance: (share) => next() < share,
    pick: (list) => {
      const found = list[Math.floor(next() * list.length)];
      if (found === undefined) throw new Error("nothing to pick from");
      return found;
    },
  };
}
