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
  const limits = loads.flatMap(({ station, offset, reach }): readonly (readonly [number, number])[] => {
    const z = layout.stations[station]?.z;
    return z === undefined || !Number.isFinite(reach) ? [] : [[-reach - z - offset, reach - z - offset]];
  });
  if (limits.length === 0) return layout;
  const ends = layout.stations.map((station) => ({ from: station.z - stationLength(station) / 2, to: station.z + stationLength(station) / 2 }));
  const bed = [-bedLength / 2 - Math.min(...ends.map(({ from }) => from)), bedLength / 2 - Math.max(...ends.map(({ to }) => to))] as const;
  const [least, most] = [Math.max(...limits.map(([from]) => from)), Math.min(...limits.map(([, to]) => to))];
  const wanted = least <= most ? Math.min(Math.max(0, least), most) : (least + most) / 2;
  const by = Math.min(Math.max(wanted, Math.min(0, bed[0])), Math.max(0, bed[1]));
  return by === 0 ? layout : { ...layout, stations: layout.stations.map((station) => ({ ...station, z: station.z + by })) };
}
