/** The states in which a move cannot be made: those that agree with `value` on `mask`. */
export interface BlockedPattern {
  readonly mask: number;
  readonly value: number;
}

/** What has been learned of moves: patterns of states in which they cannot be made. */
export interface Facts {
  readonly block: (move: number, pattern: BlockedPattern) => void;
  readonly blocked: (move: number, formed: number) => boolean;
  /** How many patterns there are. */
  readonly count: () => number;
}

export function createFacts(moves: number): Facts {
  const patterns = Array.from({ length: moves }, (): BlockedPattern[] => []);
  /** Mask and value by turns, for a quick look. */
  const flat: Int32Array[] = patterns.map(() => new Int32Array(0));
  let count = 0;
  return {
    block: (move, pattern) => {
      const known = patterns[move];
      if (known === undefined) return;
      const kept = known.filter((one) => !covers(pattern, one));
      patterns[move] = [...kept, pattern];
      flat[move] = Int32Array.from([...kept, pattern].flatMap(({ mask, value }) => [mask, value]));
      count += 1;
    },
    blocked: (move, formed) => {
      const known = flat[move] as Int32Array;
      for (let i = 0; i < known.length; i += 2) if ((formed & (known[i] as number)) === known[i + 1]) return true;
      return false;
    },
    count: () => count,
  };
}

/** Does the first pattern hold wherever the second does? */
const covers = (a: BlockedPattern, b: BlockedPattern): boolean => (a.mask & b.mask) === a.mask && (b.value & a.mask) === a.value;
