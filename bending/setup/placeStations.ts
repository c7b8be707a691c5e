import type { Machine } from "../tooling/machine";
import { stationLength, type Layout, type Station } from "./layout";

/** mm between stations that stand near each other: room for a hand to set the tools. Common practice, no source. */
const NEAR_MM = 100;

/**
 * The ways to stand stations on the bed that are tried: every order from left to right, near each other and
 * so far apart that the overhanging sheet passes clear of the next one; the whole about the middle of the bed.
 */
export function placeStations(stations: readonly Station[], overhang: number, machine: Machine): readonly Layout[] {
  const { times, bedLength } = machine;
  const count = stations.reduce((sum, { punch, die }) => sum + punch.pieces.length + die.pieces.length, 0);
  const setupSeconds = stations.length * times.stationSetup + count * times.sectionPlace;
  const gaps = stations.length < 2 ? [0] : [...new Set([NEAR_MM, Math.max(NEAR_MM, Math.ceil(overhang))])];
  return gaps.flatMap((gap) => {
    const total = stations.reduce((sum, station) => sum + stationLength(station), 0) + gap * (stations.length - 1);
    if (total > bedLength) return [];
    return orders(stations.length).map((order): Layout => {
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

function orders(count: number): readonly (readonly number[])[] {
  if (count <= 1) return [Array.from({ length: count }, (_, i) => i)];
  return orders(count - 1).flatMap((shorter) =>
    Array.from({ length: count }, (_, place) => [...shorter.slice(0, place), count - 1, ...shorter.slice(place)]));
}
