import type { Die, Punch } from "../tooling/tool";
import type { Run } from "./composeRuns";

/** One punch run over one die run, both with the same middle. */
export interface Station {
  /** Index of the tool pair. */
  readonly pair: number;
  readonly punch: Run;
  readonly die: Run;
}

/** Stations standing on the bed. */
export interface Layout {
  readonly stations: readonly PlacedStation[];
  readonly setupSeconds: number;
}

export interface PlacedStation extends Station {
  /** Middle of the station from the middle of the bed, mm. */
  readonly z: number;
}

/** What a station is wanted for: a pair and the length of the bend lines that it must hold. */
export interface StationWish {
  readonly pair: number;
  readonly punch: Punch;
  readonly die: Die;
  readonly lineLength: number;
}

export const stationLength = (station: Station): number => Math.max(station.punch.length, station.die.length);
