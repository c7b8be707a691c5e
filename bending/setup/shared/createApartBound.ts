import type { FewestPieces } from "./createFewestPieces";
import type { PairPlace, PreparedWish } from "./preparedWish";
import { bothRooms } from "./bothRooms";

export interface ApartBound {
  /** Stations that these wishes need at the least. */
  readonly stations: number;
  /** What so many stations cost at the least. */
  readonly cost: number;
}

/**
 * A lower bound for some of the wishes: a set of them of which no two go on one station needs a station each. Such a set is
 * gathered in two ways, those that end shortest first and those that begin longest first (each is the largest set where
 * every wish is one interval of lengths, as for a single pair), and the larger one counts.
 */
export function createApartBound(wishes: readonly PreparedWish[], pairs: readonly PairPlace[], fewest: FewestPieces): (open: readonly number[]) => ApartBound {
  const alone = wishes.map(({ rooms }) => Math.min(...pairs.map(({ punch, die }, pair) => {
    const room = rooms[pair];
    return room ? fewest(punch, die, room) ?? Infinity : Infinity;
  })));
  const together = wishes.map((one) => wishes.map((other) => pairs.some(({ punch, die }, pair) => {
    const [a, b] = [one.rooms[pair], other.rooms[pair]];
    const room = a && b ? bothRooms(a, b) : null;
    return room !== null && fewest(punch, die, room) !== null;
  })));
  const order = (rank: (index: number) => number) => {
    const place = new Map(wishes.map((_, index) => index).sort((a, b) => rank(a) - rank(b)).map((index, at) => [index, at]));
    return (a: number, b: number) => (place.get(a) ?? 0) - (place.get(b) ?? 0);
  };
  const ends = (index: number) => Math.max(...(wishes[index]?.rooms ?? []).map((room) => (room ? Math.min(room.punch[1], room.die[1]) : -Infinity)));
  const begins = (index: number) => Math.min(...(wishes[index]?.rooms ?? []).map((room) => (room ? Math.max(room.punch[0], room.die[0]) : Infinity)));
  const orders = [order(ends), order((index) => -begins(index))];
  return (open) => {
    let best: ApartBound = { stations: 0, cost: 0 };
    for (const by of orders) {
      const apart: number[] = [];
      for (const index of [...open].sort(by)) if (apart.every((other) => !together[index]?.[other])) apart.push(index);
      const cost = apart.reduce((sum, index) => sum + (alone[index] ?? 0), 0);
      if (apart.length > best.stations || (apart.length === best.stations && cost > best.cost)) best = { stations: apart.length, cost };
    }
    return best;
  };
}
