import type { Interval } from "../geometry/interval";
import type { MachineSettings } from "../tooling/machine";
import { freeShifts, type Standing } from "./freeShifts";
import type { PlacedStation } from "./layout";
import { nearestTo } from "./nearestTo";

/** What is forbidden to each tool of a station, from the middle of the stroke's line. */
export interface ForbiddenAt {
  readonly punch: readonly Interval[];
  readonly die: readonly Interval[];
}

/**
 * Where on a station a stroke's line may lie so that it is covered and no tool on the bed stands where it must
 * not: the place nearest to the station's middle, from that middle, within the limits given; null when there is none.
 */
export function placeOnStation(
  halfLength: number,
  station: PlacedStation,
  bed: readonly PlacedStation[],
  forbidden: (station: PlacedStation) => ForbiddenAt,
  settings: MachineSettings,
  within?: Interval,
): number | null {
  const reach = Math.min(station.punch.length, station.die.length) / 2 - (halfLength - settings.maxUncoveredEnd);
  const standing = bed.flatMap((other): readonly Standing[] => {
    const { punch, die } = forbidden(other);
    const offset = other.z - station.z;
    return [{ offset, length: other.punch.length, forbidden: punch }, { offset, length: other.die.length, forbidden: die }];
  });
  const free = freeShifts(reach, standing);
  return nearestTo(0, within === undefined ? free : free.flatMap((one) => overlap(one, within)));
}

const overlap = (a: Interval, b: Interval): readonly Interval[] => (a[0] <= b[1] && a[1] >= b[0] ? [[Math.max(a[0], b[0]), Math.min(a[1], b[1])]] : []);
