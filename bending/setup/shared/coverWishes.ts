import { SAME_COST } from "./carryCost";
import type { ApartBound } from "./createApartBound";
import type { FewestPieces } from "./createFewestPieces";
import type { PairPlace, PreparedWish } from "./preparedWish";
import { bothRooms } from "./bothRooms";
import { isWithinRoom } from "./isWithinRoom";
import type { Room } from "./room";
import type { SearchEffort } from "./searchEffort";

/** A station of the search: its pair, and the lengths that are left to it by what it holds. */
export interface OpenStation {
  readonly pair: number;
  readonly room: Room;
  /** What it costs at the least. */
  readonly cost: number;
}

export interface CoverQuestion {
  readonly wishes: readonly PreparedWish[];
  readonly pairs: readonly PairPlace[];
  readonly fewest: FewestPieces;
  readonly apart: (open: readonly number[]) => ApartBound;
  /** What these stations cost together at the least, as they share the stock; infinite when they cannot. */
  readonly shared: (stations: readonly OpenStation[]) => number;
  /** So many stations at the most. */
  readonly count: number;
  /** Stations longer together than this are too long for the bed. */
  readonly longest: number;
  /** Takes or leaves a set of stations that holds everything, and says below which cost another is still of use; -Infinity ends the search. */
  readonly offer: (stations: readonly OpenStation[]) => number;
  /** Cost below which stations are of use, to begin with. */
  readonly under: number;
  readonly effort: SearchEffort;
}

/** A wish not placed yet, with what each station would become with it; null where it does not go. */
interface OpenWish {
  readonly index: number;
  readonly into: readonly (OpenStation | null)[];
}

/** Every state is known by its stations alone; so many are remembered. */
const MOST_STATES = 400_000;

/**
 * Every way to divide wishes among stations that can cost less than what is known, by depth first: the wish with the
 * fewest places goes next, into each station that can take it and into a new one of each of its pairs. A wish that a station
 * holds without getting narrower is placed at once. A branch ends when wishes of which no two go together are too many for
 * the stations left, when its cost is reached, when the bed is full, or when the same stations were seen before.
 */
export function coverWishes({ wishes, pairs, fewest, apart, shared, count, longest, offer, under, effort }: CoverQuestion): void {
  let limit = under;
  const seen = new Set<string>();
  const rooms = new Map<string, number>();
  const nameOf = ({ pair, room }: OpenStation): number => {
    const key = `${pair}/${room.punch.join()}/${room.die.join()}/${room.longer.join()}/${room.together}`;
    const name = rooms.get(key) ?? rooms.size;
    rooms.set(key, name);
    return name;
  };
  const stationOf = (pair: number, room: Room | null | undefined): OpenStation | null => {
    const place = pairs[pair];
    const cost = room && place ? fewest(place.punch, place.die, room) : null;
    return room && cost !== null ? { pair, room, cost } : null;
  };
  const withWish = (station: OpenStation, index: number): OpenStation | null => {
    const room = wishes[index]?.rooms[station.pair];
    return room ? stationOf(station.pair, bothRooms(station.room, room)) : null;
  };
  const holds = (station: OpenStation, index: number) => {
    const room = wishes[index]?.rooms[station.pair];
    return !!room && isWithinRoom(station.room, room);
  };
  /** The wishes left once the station at `at` is this one. */
  const left = (open: readonly OpenWish[], at: number, station: OpenStation): readonly OpenWish[] => open.flatMap(({ index, into }) => {
    if (holds(station, index)) return [];
    const entered = at < into.length && into[at] === null ? null : withWish(station, index);
    return [{ index, into: at < into.length ? into.map((one, i) => (i === at ? entered : one)) : [...into, entered] }];
  });
  const search = (stations: readonly OpenStation[], open: readonly OpenWish[]): void => {
    effort.step();
    if (effort.spent() || limit === -Infinity) return;
    const spent = Math.max(stations.reduce((sum, { cost }) => sum + cost, 0), shared(stations));
    const long = stations.reduce((sum, { room }) => sum + Math.max(room.punch[0], room.die[0]), 0);
    if (spent >= limit || long > longest + SAME_COST) return;
    if (open.length === 0) { limit = offer(stations); return; }
    const lonely = apart(open.filter(({ into }) => into.every((one) => one === null)).map(({ index }) => index));
    const free = count - stations.length;
    if (lonely.stations > free) return;
    const dearer = free > 0 ? 0 : Math.max(...open.map(({ into }) => Math.min(...into.map((one, i) => (one ? one.cost - (stations[i]?.cost ?? 0) : Infinity)))));
    if (spent + lonely.cost + dearer >= limit) return;
    const name = stations.map(nameOf).sort((a, b) => a - b).join();
    if (seen.has(name)) return;
    if (seen.size < MOST_STATES) seen.add(name);
    const fresh = (index: number) => (free === 0 ? [] : pairs.flatMap((_, pair) => stationOf(pair, wishes[index]?.rooms[pair]) ?? []));
    const placesOf = ({ index, into }: OpenWish) => into.filter((one) => one !== null).length + (free === 0 ? 0 : (wishes[index]?.rooms ?? []).filter((room) => room !== null).length);
    const next = open.reduce((a, b) => (placesOf(b) < placesOf(a) ? b : a));
    const rest = open.filter((one) => one !== next);
    const entered = next.into.flatMap((one, at) => (one ? [{ at, one, more: one.cost - (stations[at]?.cost ?? 0) }] : []));
    for (const { at, one } of entered.sort((a, b) => a.more - b.more)) search(stations.map((old, i) => (i === at ? one : old)), left(rest, at, one));
    for (const one of fresh(next.index).sort((a, b) => a.cost - b.cost)) search([...stations, one], left(rest, stations.length, one));
  };
  if (wishes.length > 0) search([], wishes.map((_, index) => ({ index, into: [] })));
}
