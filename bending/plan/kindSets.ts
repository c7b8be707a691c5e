import type { StationKind } from "../setup/stationKinds";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { BedQuestion } from "./bedQuestion";
import { SAME_WEIGHT } from "./createCandidateKeeper";
import { kindFamilies, type KindFamily } from "./kindFamilies";
import { kindsFor } from "./kindsFor";
import { setupSeconds } from "./setupSeconds";

/** Kinds of station for one bed; no bed of them on which every station is used weighs less than `floor`. */
export interface KindSet {
  readonly kinds: readonly StationKind[];
  /** Kinds never better than each of them, for when the stock does not hold them together. */
  readonly spares: readonly (readonly StationKind[])[];
  readonly pieces: number;
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
  const lines = [...new Set(situation.moves.map(({ halfLength }) => 2 * halfLength))];
  const families = [...kindFamilies(kindsFor(situation, count, question.favoured), lines, machine.settings.maxUncoveredEnd)].sort((a, b) => a.best.pieces - b.best.pieces);
  const fewest = families[0]?.best.pieces ?? 0;
  const heightOf = ({ pair }: StationKind) => (pairs[pair]?.punch.height ?? 0) + (pairs[pair]?.die.height ?? 0);
  const worst = keeper.worst() - SAME_WEIGHT;
  const found: KindSet[] = [];
  const add = (chosen: readonly KindFamily[], pieces: number, from: number): boolean => {
    if (budget.shouldStop()) return false;
    for (let next = from; next < families.length; next += 1) {
      const family = families[next];
      if (family === undefined) continue;
      const one = family.best;
      const left = count - chosen.length - 1;
      const setup = setupSeconds(machine, count, pieces + one.pieces + left * Math.max(fewest, one.pieces));
      if (setup + least * budget.batch >= worst) break;
      if (chosen[0] && Math.abs(heightOf(chosen[0].best) - heightOf(one)) > SAME_SHUT_HEIGHT_MM) continue;
      const longer = [...chosen, family];
      if (left === 0 && !longer.some(({ best: kind }) => Math.min(kind.punchLength, kind.dieLength) >= longest)) continue;
      if (left > 0) {
        if (!add(longer, pieces + one.pieces, next + 1)) return false;
        continue;
      }
      const set = setOf(question, longer.map(({ best }) => best), longer.map(({ spares }) => spares));
      if (set.floor < worst) found.push(set);
    }
    return true;
  };
  return add([], 0, 0) ? found : null;
}

function setOf({ situation: { machine }, least, budget }: BedQuestion, kinds: readonly StationKind[], spares: KindSet["spares"]): KindSet {
  const pieces = kinds.reduce((sum, kind) => sum + kind.pieces, 0);
  const setup = setupSeconds(machine, kinds.length, pieces);
  return { kinds, spares, pieces, setup, floor: setup + (least + walkAtLeast(kinds, machine.times.walkPerMetre)) * budget.batch };
}

/** The sets with one kind changed for a spare of its own; none of those `seen`, which grows. */
export function spareSets(question: BedQuestion, set: KindSet, seen: Set<string>): readonly KindSet[] {
  return set.kinds.flatMap((_, place) => (set.spares[place] ?? []).flatMap((spare) => {
    const kinds = set.kinds.map((kind, index) => (index === place ? spare : kind));
    const key = kinds.map(({ pair, punchLength, dieLength }) => [pair, punchLength, dieLength].join()).sort().join("/");
    const other = setOf(question, kinds, set.spares);
    if (seen.has(key) || other.floor >= question.keeper.worst()) return [];
    seen.add(key);
    return [other];
  }));
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
