import { SAME_SHUT_HEIGHT_MM } from "../../core/tolerance";
import type { MachineSettings } from "../../tooling/machine";
import type { FewestPieces } from "./createFewestPieces";
import type { PieceStock } from "./createPieceStock";
import type { PairPlace, PreparedWish } from "./preparedWish";
import { roomOf } from "./roomOf";
import type { SharedWish } from "./sharedWish";

/** The pairs of one shut height and what they leave each wish. */
export interface ShutHeight {
  /** Of the lowest pair, mm. */
  readonly height: number;
  readonly pairs: readonly PairPlace[];
  readonly wishes: readonly PreparedWish[];
  /** Wishes that no pair of this height can make with the pieces there are. */
  readonly missing: readonly SharedWish[];
}

/** The shut heights that pairs of the wishes have; pairs that lie within the tolerance of one another are of one. */
export function shutHeights(wishes: readonly SharedWish[], stocks: readonly PieceStock[], fewest: FewestPieces, settings: MachineSettings): readonly ShutHeight[] {
  const place = new Map(stocks.map(({ tool }, index) => [`${tool.kind} ${tool.id}`, index]));
  const known = new Map<string, PairPlace & { readonly height: number }>();
  for (const { punch, die } of wishes.flatMap(({ ways }) => ways)) {
    const [above, below] = [place.get(`punch ${punch}`), place.get(`die ${die}`)];
    if (above === undefined || below === undefined) continue;
    known.set(`${above}/${below}`, { punch: above, die: below, height: (stocks[above]?.tool.height ?? 0) + (stocks[below]?.tool.height ?? 0) });
  }
  const all = [...known.values()].sort((a, b) => a.height - b.height);
  const spans = all.map(({ height }, from) => ({ from, height, pairs: all.filter((one) => one.height >= height && one.height <= height + SAME_SHUT_HEIGHT_MM) }));
  const largest = spans.filter(({ pairs, from }) => !spans.some((other) => other.from < from && pairs.every((one) => other.pairs.includes(one))));
  return largest.map(({ height, pairs }): ShutHeight => {
    const prepared = wishes.map((wish): PreparedWish => ({
      wish,
      rooms: pairs.map(({ punch, die }) => {
        const way = wish.ways.find((one) => place.get(`punch ${one.punch}`) === punch && place.get(`die ${one.die}`) === die);
        const room = way ? roomOf(wish, way, settings) : null;
        return room !== null && fewest(punch, die, room) !== null ? room : null;
      }),
    }));
    return { height, pairs, wishes: prepared, missing: prepared.filter(({ rooms }) => rooms.every((room) => room === null)).map(({ wish }) => wish) };
  });
}
