import { stationKinds, type StationKind } from "../setup/stationKinds";
import type { Situation } from "./situation";

/** How many likeliest pairs are tried together on a bed of several stations. */
export const PAIRS_OF_SEVERAL = 6;

/**
 * The kinds of station that a bed of so many stations may have: for one station every pair, for several the likeliest
 * pairs and those that `favoured` names; as long as one of the lines that the pair may have to hold.
 */
export function kindsFor(situation: Situation, count: number, favoured: ReadonlySet<number>): readonly StationKind[] {
  const { pairs, runs } = situation;
  return pairs.filter(({ index }) => count === 1 || index < PAIRS_OF_SEVERAL || favoured.has(index)).flatMap(({ index, punch, die }) =>
    stationKinds(lineLengths(situation, index).map((lineLength) => ({ pair: index, punch, die, lineLength })), runs));
}

/** The different lengths of line that the pair may have to hold, longest first. */
function lineLengths({ moves, fits }: Situation, pair: number): readonly number[] {
  const lengths = moves.filter(({ bends }) => bends.every((bend) => fits[bend]?.[pair]?.ok)).map(({ halfLength }) => Math.round(halfLength * 2e4) / 1e4);
  return [...new Set(lengths)].sort((a, b) => b - a);
}
