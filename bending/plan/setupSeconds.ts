import type { Machine } from "../tooling/machine";

/** Setting so many stations of so many pieces altogether; a station has two pieces at the least. */
export function setupSeconds({ times }: Machine, stations: number, pieces = 2 * stations): number {
  return stations * times.stationSetup + pieces * times.sectionPlace;
}
