import { stationLength, type Layout } from "./layout";

/** A load that a station must bear: its middle from the station's, and how far from the bed's middle it may be, mm. */
export interface StationLoad {
  readonly station: number;
  readonly offset: number;
  /** Infinite where nothing limits it. */
  readonly reach: number;
}

/**
 * The stations moved together along the bed, no farther than the bed goes, so that every load is as near its middle as it must be; when that
 * cannot be for all, so that the one that is farthest out of its reach is as little out as can be. As little as will do.
 */
export function nearMiddle(layout: Layout, loads: readonly StationLoad[], bedLength: number): Layout {
  const by = loads.length === 0 ? 0 : shiftNearMiddle(layout.stations.map((station) => ({ z: station.z, length: stationLength(station) })), loads, bedLength);
  return by === 0 ? layout : { ...layout, stations: layout.stations.map((station) => ({ ...station, z: station.z + by })) };
}

/** How far `nearMiddle` moves stations of these middles and lengths, mm. */
export function shiftNearMiddle(stations: readonly { readonly z: number; readonly length: number }[], loads: readonly StationLoad[], bedLength: number): number {
  const limits = loads.flatMap(({ station, offset, reach }): readonly (readonly [number, number])[] => {
    const z = stations[station]?.z;
    return z === undefined || !Number.isFinite(reach) ? [] : [[-reach - z - offset, reach - z - offset]];
  });
  if (limits.length === 0) return 0;
  const bed = [-bedLength / 2 - Math.min(...stations.map(({ z, length }) => z - length / 2)), bedLength / 2 - Math.max(...stations.map(({ z, length }) => z + length / 2))] as const;
  const [least, most] = [Math.max(...limits.map(([from]) => from)), Math.min(...limits.map(([, to]) => to))];
  const wanted = least <= most ? Math.min(Math.max(0, least), most) : (least + most) / 2;
  return Math.min(Math.max(wanted, Math.min(0, bed[0])), Math.max(0, bed[1]));
}
