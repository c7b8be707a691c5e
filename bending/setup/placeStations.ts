import type { Machine } from "../tooling/machine";
import { stationLength, type Layout, type Station } from "./layout";
import { leastWalkOrder, MOST_ORDERED } from "./leastWalkOrder";

/** mm between stations that stand near each other: room for a hand to set the tools. Common practice, no source. */
export const NEAR_GAP_MM = 100;

/** Up to so many stations are tried in every order from left to right; more stand in the order with the least walking for the strokes wanted, and in its reverse. */
const EVERY_ORDER_UP_TO = 4;

/**
 * Ways to stand stations on the bed: each order from left to right with each of the gaps between two; the whole about the middle of the bed.
 * `strokes`: the station of each stroke that is wanted, in turn.
 */
export function placeStations(stations: readonly Station[], gaps: readonly number[], machine: Machine, strokes: readonly number[] = []): readonly Layout[] {
  const { times, bedLength } = machine;
  const count = stations.reduce((sum, { punch, die }) => sum + punch.pieces.length + die.pieces.length, 0);
  const setupSeconds = stations.length * times.stationSetup + count * times.sectionPlace;
  return (stations.length < 2 ? [0] : [...new Set(gaps)]).flatMap((gap) => {
    const total = stations.reduce((sum, station) => sum + stationLength(station), 0) + gap * (stations.length - 1);
    if (total > bedLength) return [];
    return ordersOf(stations, gap, strokes).map((order): Layout => {
      const z = new Map<number, number>();
      let at = -total / 2;
      for (const index of order) {
        const length = stationLength(stations[index] ?? missing());
        z.set(index, at + length / 2);
        at += length + gap;
      }
      return { stations: stations.map((station, index) => ({ ...station, z: z.get(index) ?? 0 })), setupSeconds };
    });
  });
}

function missing(): never {
  throw new Error("invariant: an order names the stations there are");
}

function ordersOf(stations: readonly Station[], gap: number, strokes: readonly number[]): readonly (readonly number[])[] {
  if (stations.length <= EVERY_ORDER_UP_TO) return orders(stations.length);
  const order = stations.length > MOST_ORDERED ? stations.map((_, index) => index) : leastWalkOrder(stations.map(stationLength), gap, strokes);
  return [order, [...order].reverse()];
}

function orders(count: number): readonly (readonly number[])[] {
  if (count <= 1) return [Array.from({ length: count }, (_, i) => i)];
  return orders(count - 1).flatMap((shorter) =>
    Array.from({ length: count }, (_, place) => [...shorter.slice(0, place), count - 1, ...shorter.slice(place)]));
}
