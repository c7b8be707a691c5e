import type { Interval } from "../../geometry/interval";
import type { Machine } from "../../tooling/machine";
import { offCentreReach } from "../../tooling/offCentre";
import { shiftNearMiddle, type StationLoad } from "../nearMiddle";
import { NEAR_GAP_MM } from "../placeStations";
import type { SharedWay, SharedWish } from "./sharedWish";

/** A station whose runs are known but not its place. */
export interface StandingStation {
  readonly punch: string;
  readonly die: string;
  readonly punchLength: number;
  readonly dieLength: number;
}

/** Where a station stands and what it serves; z from the middle of the bed. */
export interface StationPlace {
  readonly station: number;
  readonly z: number;
  readonly wishes: readonly { readonly id: string; readonly z: number }[];
}

interface Served { readonly wish: SharedWish; readonly lineAt: number; readonly beyond: number }

/**
 * Stands stations on the bed, left to right; null when the way it does so does not come out. Each bend goes to the station, and the line to the
 * place on it, where the part sticks out least to the farther side. Between two neighbours is room for a hand and for the
 * part of either, so that no part comes where another station stands. With e the room that a station wants beside it, the room between
 * neighbours is at least all e less the least one in any order, and just that where the e rise or fall all the way;
 * the strongest load stands nearest the middle where the bed is long enough for it. The whole is then moved along the bed as far as the
 * machine's off-centre diagram asks.
 */
export function standOnBed(stations: readonly StandingStation[], wishes: readonly SharedWish[], machine: Machine): readonly StationPlace[] | null {
  const { bedLength, settings } = machine;
  const served = stations.map((): Served[] => []);
  for (const wish of wishes) {
    const places = stations.flatMap((station, index) => wish.ways.filter(({ punch, die }) => punch === station.punch && die === station.die).flatMap((way) => {
      const place = placeOn(station, wish, way, settings.maxUncoveredEnd);
      return place === null ? [] : [{ index, ...place }];
    }));
    if (places.length === 0) return null;
    const { index, lineAt, beyond } = places.reduce((a, b) => (b.beyond < a.beyond - 1e-9 ? b : a));
    served[index]?.push({ wish, lineAt, beyond });
  }
  const length = stations.map(({ punchLength, dieLength }) => Math.max(punchLength, dieLength));
  const beside = served.map((ofStation) => Math.max(NEAR_GAP_MM, ...ofStation.map(({ beyond }) => beyond)));
  const force = served.map((ofStation) => Math.max(0, ...ofStation.map(({ wish }) => wish.forceKN)));
  const rising = stations.map((_, index) => index).sort((a, b) => (beside[a] ?? 0) - (beside[b] ?? 0));
  const strongest = stations.map((_, index) => index).sort((a, b) => (force[b] ?? 0) - (force[a] ?? 0));
  const strongInside = strongest.reduce<readonly number[]>((order, index, at) => (at % 2 === 0 ? [...order, index] : [index, ...order]), []);
  for (const order of [strongInside, rising]) {
    const z = placesOf(order, length, beside);
    const [last, first] = [order[order.length - 1] ?? 0, order[0] ?? 0];
    const total = (z[last] ?? 0) + (length[last] ?? 0) / 2 - (z[first] ?? 0) + (length[first] ?? 0) / 2;
    if (total > bedLength + 1e-6) continue;
    const loads = served.flatMap((ofStation, station) => ofStation.map(({ wish, lineAt }): StationLoad => ({ station, offset: lineAt, reach: offCentreReach(machine, wish.forceKN) })));
    const start = -total / 2;
    const by = start + shiftNearMiddle(z.map((middle, station) => ({ z: middle + start, length: length[station] ?? 0 })), loads, bedLength);
    if (loads.some(({ station, offset, reach }) => Math.abs((z[station] ?? 0) + by + offset) > reach + 1e-6)) continue;
    return order.map((station) => ({
      station,
      z: (z[station] ?? 0) + by,
      wishes: (served[station] ?? []).map(({ wish, lineAt }) => ({ id: wish.id, z: (z[station] ?? 0) + by + lineAt })),
    }));
  }
  return null;
}

/** Middles from the left end of the first station. */
function placesOf(order: readonly number[], length: readonly number[], beside: readonly number[]): readonly number[] {
  const z: number[] = [];
  let at = 0;
  order.forEach((index, place) => {
    const before = order[place - 1];
    if (before !== undefined) at += Math.max(beside[before] ?? 0, beside[index] ?? 0);
    z[index] = at + (length[index] ?? 0) / 2;
    at += length[index] ?? 0;
  });
  return z;
}

/** The line's middle from the station's, and how far the part sticks out beyond the station; null when the station does not hold it. */
function placeOn({ punchLength, dieLength }: StandingStation, { lineLength, sheet }: SharedWish, { punchWindow, dieWindow }: SharedWay, uncovered: number): { readonly lineAt: number; readonly beyond: number } | null {
  const reach = Math.min(punchLength, dieLength) / 2 - lineLength / 2 + uncovered;
  const span = ([from, to]: Interval, length: number): Interval => [length / 2 - to, -from - length / 2];
  const spans: readonly Interval[] = [[-reach, reach], span(punchWindow, punchLength), span(dieWindow, dieLength)];
  const [from, to] = [Math.max(...spans.map((one) => one[0])), Math.min(...spans.map((one) => one[1]))];
  if (from > to + 2e-6) return null;
  const lineAt = Math.max(from, Math.min(to, -(sheet[0] + sheet[1]) / 2));
  return { lineAt, beyond: Math.max(-sheet[0] - lineAt, sheet[1] + lineAt) - Math.max(punchLength, dieLength) / 2 };
}
