import type { StationKind } from "../setup/stationKinds";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { BedQuestion } from "./bedQuestion";
import { SAME_WEIGHT } from "./createCandidateKeeper";
import { kindsFor } from "./kindsFor";
import { setupSeconds } from "./setupSeconds";

/** Kinds of station for one bed; no bed of them on which every station is used weighs less than `floor`. */
export interface KindSet {
  readonly kinds: readonly StationKind[];
  readonly setup: number;
  readonly floor: number;
}

/** mm. Shut heights of stations on one bed must agree this well, as one ram closes them all. Common practice, no source. */
const SAME_SHUT_HEIGHT_MM = 0.1;

/** mm. Over rounding noise; the search itself decides what is as near as this. */
const NOISE_MM = 1e-3;

/** The sets of `count` kinds that may be better than what is kept; null when told to stop. */
export function kindSets(question: BedQuestion, count: number): readonly KindSet[] | null {
  const { situation, keeper, least, budget } = question;
  const { machine, pairs } = situation;
  const longest = longestNeeded(question);
  const kinds = [...kindsFor(situation, count, question.favoured)].sort((a, b) => a.pieces - b.pieces);
  const fewest = kinds[0]?.pieces ?? 0;
  const heightOf = ({ pair }: StationKind) => (pairs[pair]?.punch.height ?? 0) + (pairs[pair]?.die.height ?? 0);
  const worst = keeper.worst() - SAME_WEIGHT;
  const found: KindSet[] = [];
  const add = (chosen: readonly StationKind[], pieces: number, from: number): boolean => {
    if (budget.shouldStop()) return false;
    for (let next = from; next < kinds.length; next += 1) {
      const one = kinds[next];
      if (one === undefined) continue;
      const left = count - chosen.length - 1;
      const setup = setupSeconds(machine, count, pieces + one.pieces + left * Math.max(fewest, one.pieces));
      if (setup + least * budget.batch >= worst) break;
      if (chosen[0] && Math.abs(heightOf(chosen[0]) - heightOf(one)) > SAME_SHUT_HEIGHT_MM) continue;
      const longer = [...chosen, one];
      if (left === 0 && !longer.some((kind) => Math.min(kind.punchLength, kind.dieLength) >= longest)) continue;
      if (left > 0) {
        if (!add(longer, pieces + one.pieces, next + 1)) return false;
        continue;
      }
      const floor = setup + (least + walkAtLeast(longer, machine.times.walkPerMetre)) * budget.batch;
      if (floor < worst) found.push({ kinds: longer, setup, floor });
    }
    return true;
  };
  return add([], 0, 0) ? found : null;
}

/** mm. Some station holds the bend with the longest line, however it is made; what may stay uncovered taken off. */
function longestNeeded({ situation: { moves, part, machine } }: BedQuestion): number {
  const lines = part.bends.map((_, bend) => Math.min(...moves.filter(({ bends }) => bends.includes(bend)).map(({ halfLength }) => 2 * halfLength)));
  return Math.max(0, ...lines) - 2 * machine.settings.maxUncoveredEnd - NOISE_MM;
}

/** Every station is walked to at least once, the nearest two standing near each other. */
function walkAtLeast(kinds: readonly StationKind[], walkPerMetre: number): number {
  const lengths = kinds.map(({ length }) => length).sort((a, b) => a - b);
  const nearest = ((lengths[0] ?? 0) + (lengths[1] ?? 0)) / 2 + NEAR_GAP_MM;
  return (kinds.length - 1) * (nearest / 1000) * walkPerMetre;
}
