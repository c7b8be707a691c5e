import { stationLength, type Station, type StationWish } from "./layout";
import type { RunsOf } from "./createRuns";

/** Stations of one pair with the same two lengths: what they are free to do alone on a bed is the same. */
export interface StationKind {
  readonly pair: number;
  readonly punchLength: number;
  readonly dieLength: number;
  /** Pieces of punch and die together, as few as the whole stock allows. */
  readonly pieces: number;
  readonly length: number;
}

/** mm. Runs that agree this well are of one length: their sums are kept in thousandths. */
const SAME_LENGTH_MM = 5e-4;

/** Every kind of station that the whole stock makes for one of the wishes (all of one pair), fewest pieces first. */
export function stationKinds(wishes: readonly StationWish[], runs: RunsOf): readonly StationKind[] {
  const kinds = new Map<string, StationKind>();
  for (const { pair, punch, die, lineLength } of wishes) {
    for (const above of runs(punch, lineLength)) {
      for (const below of runs(die, lineLength)) {
        const key = [above, below].map(({ length }) => Math.round(length / SAME_LENGTH_MM)).join("/");
        const pieces = above.pieces.length + below.pieces.length;
        if ((kinds.get(key)?.pieces ?? Infinity) <= pieces) continue;
        kinds.set(key, { pair, punchLength: above.length, dieLength: below.length, pieces, length: stationLength({ pair, punch: above, die: below } satisfies Station) });
      }
    }
  }
  return [...kinds.values()].sort((a, b) => a.pieces - b.pieces || a.punchLength + a.dieLength - b.punchLength - b.dieLength);
}
