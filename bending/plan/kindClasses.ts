import type { StationKind } from "../setup/stationKinds";
import type { Alone, Need } from "./createAlone";
import type { Situation } from "./situation";

/** Kinds of one pair that, alone on the bed, can make just the same moves in every state. */
export interface KindClass {
  readonly pair: number;
  /** Fewest pieces first. */
  readonly kinds: readonly StationKind[];
  readonly shortest: number;
  /** For every set of formed bends (by its place in `sets`) the moves that can be made, as bits, `words` numbers each. */
  readonly can: Int32Array;
}

export interface KindClasses {
  readonly classes: readonly KindClass[];
  readonly words: number;
}

/** Sorts kinds into classes over the sets of formed bends that an order can come to; null when told to stop. */
export function kindClasses(situation: Situation, alone: Alone, kinds: readonly StationKind[], sets: readonly number[], shouldStop: () => boolean): KindClasses | null {
  const words = Math.ceil(situation.moves.length / 32);
  const classes: KindClass[] = [];
  for (const pair of new Set(kinds.map((kind) => kind.pair))) {
    const table = needsOf(situation, alone, pair, sets, shouldStop);
    if (table === null) return null;
    const groups = new Map<string, StationKind[]>();
    for (const kind of kinds.filter((one) => one.pair === pair)) {
      const key = table.needs.map((need) => (alone.holds(kind, need) ? 1 : 0)).join("");
      if (!key.includes("1")) continue;
      groups.set(key, [...(groups.get(key) ?? []), kind]);
    }
    for (const [key, members] of groups) {
      const can = new Int32Array(words * sets.length);
      for (const { set, move, need } of table.entries) {
        const at = set * words + (move >> 5);
        if (key[need] === "1") can[at] = (can[at] ?? 0) | (1 << (move & 31));
      }
      classes.push({ pair, kinds: members, shortest: Math.min(...members.map(({ length }) => length)), can });
    }
  }
  return { classes, words };
}

interface NeedTable {
  readonly needs: readonly Need[];
  readonly entries: readonly { readonly set: number; readonly move: number; readonly need: number }[];
}

function needsOf({ moves }: Situation, alone: Alone, pair: number, sets: readonly number[], shouldStop: () => boolean): NeedTable | null {
  const index = new Map<Need, number>();
  const entries: { set: number; move: number; need: number }[] = [];
  for (const [set, formed] of sets.entries()) {
    if (shouldStop()) return null;
    moves.forEach(({ mask }, move) => {
      const need = mask & formed ? null : alone.need(move, formed, pair);
      if (need === null) return;
      const at = index.get(need) ?? index.size;
      index.set(need, at);
      entries.push({ set, move, need: at });
    });
  }
  return { needs: [...index.keys()], entries };
}
