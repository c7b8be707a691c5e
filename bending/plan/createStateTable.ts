/** Answers by move and set of formed bends. */
export interface StateTable<T> {
  readonly get: (move: number, formed: number) => T | undefined;
  readonly set: (move: number, formed: number, answer: T) => void;
}

/** Up to so many bends every set has a place of its own; a move's row takes 8 kB then. */
const MOST_IN_ROWS = 10;

export function createStateTable<T>(bends: number, moves: number): StateTable<T> {
  if (bends <= MOST_IN_ROWS) {
    const rows = Array.from({ length: moves }, (): (T | undefined)[] | null => null);
    return {
      get: (move, formed) => rows[move]?.[formed],
      set: (move, formed, answer) => { (rows[move] ??= Array.from({ length: 2 ** bends }, () => undefined))[formed] = answer; },
    };
  }
  const rows = Array.from({ length: moves }, () => new Map<number, T>());
  return {
    get: (move, formed) => rows[move]?.get(formed),
    set: (move, formed, answer) => { rows[move]?.set(formed, answer); },
  };
}
