import { SAME_SHUT_HEIGHT_MM } from "../core/tolerance";
import type { StationKind } from "../setup/stationKinds";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { BedQuestion } from "./bedQuestion";
import { kindFamilies, type KindFamily } from "./kindFamilies";
import { kindsFor } from "./kindsFor";
import { setupSeconds } from "./setupSeconds";

/** So many stations of a bed are each of one of these families. */
export interface KindGroup {
  readonly families: readonly KindFamily[];
  readonly times: number;
}

/** The beds whose stations are of these groups; none of them on which every station is used weighs less than `floor`. */
export interface KindSet {
  readonly groups: readonly KindGroup[];
  /** Fewest pieces, and the seconds to set them. */
  readonly pieces: number;
  readonly setup: number;
  readonly floor: number;
}
/** mm. Over rounding noise; the search itself decides what is as near as this. */
const NOISE_MM = 1e-3;

/** All beds of `count` stations, one set for each shut height. */
export function kindSets(question: BedQuestion, count: number): readonly KindSet[] {
  const { situation } = question;
  const lines = [...new Set(situation.moves.map(({ halfLength }) => 2 * halfLength))];
  const families = kindFamilies(kindsFor(situation, count, question.favoured), lines, situation.machine.settings.maxUncoveredEnd);
  const heightOf = ({ best: { pair } }: KindFamily) => (situation.pairs[pair]?.punch.height ?? 0) + (situation.pairs[pair]?.die.height ?? 0);
  const byHeight: KindFamily[][] = [];
  for (const family of families) {
    const same = byHeight.find(([first]) => first && Math.abs(heightOf(first) - heightOf(family)) <= SAME_SHUT_HEIGHT_MM);
    if (same) same.push(family);
    else byHeight.push([family]);
  }
  return byHeight.flatMap((group) => setOf(question, [{ families: group, times: count }]) ?? []);
}

/** The same beds in smaller sets: the largest group in two halves, its stations shared out between them in every way. */
export function splitSet(question: BedQuestion, { groups }: KindSet): readonly KindSet[] {
  const largest = groups.reduce((a, b) => (b.families.length > a.families.length ? b : a));
  const half = Math.ceil(largest.families.length / 2);
  const [left, right] = [largest.families.slice(0, half), largest.families.slice(half)];
  const rest = groups.filter((group) => group !== largest);
  return Array.from({ length: largest.times + 1 }, (_, times) => times).flatMap((times) =>
    setOf(question, [...rest, { families: left, times }, { families: right, times: largest.times - times }].filter((group) => group.times > 0)) ?? []);
}

/** The sets with one kind changed for a spare of its own; none of those `seen`, which grows. */
export function spareSets(question: BedQuestion, { groups }: KindSet, seen: Set<string>): readonly KindSet[] {
  return groups.flatMap(({ families: [family] }, place) => (family?.spares ?? []).flatMap((best) => {
    const changed = groups.map((group, index) => (index === place ? { times: 1, families: [{ best, spares: family?.spares ?? [] }] } : group));
    const key = changed.map(({ families: [one] }) => [one?.best.pair, one?.best.punchLength, one?.best.dieLength].join()).sort().join("/");
    if (seen.has(key)) return [];
    seen.add(key);
    return setOf(question, changed) ?? [];
  }));
}

/** Null when no bed of the set is worth looking for. */
function setOf(question: BedQuestion, groups: readonly KindGroup[]): KindSet | null {
  const { situation: { machine }, least, budget, keeper } = question;
  if (groups.some(({ families, times }) => times > families.length)) return null;
  const longest = longestNeeded(question);
  if (!groups.some(({ families }) => families.some(({ best }) => Math.min(best.punchLength, best.dieLength) >= longest))) return null;
  const leastOf = (families: readonly KindFamily[], of: (kind: StationKind) => number) => Math.min(...families.map(({ best }) => of(best)));
  const count = groups.reduce((sum, { times }) => sum + times, 0);
  const pieces = groups.reduce((sum, { families, times }) => sum + times * leastOf(families, (kind) => kind.pieces), 0);
  const setup = setupSeconds(machine, count, pieces);
  const lengths = groups.flatMap(({ families, times }) => Array.from({ length: times }, () => leastOf(families, ({ length }) => length)));
  const floor = setup + (least + walkAtLeast(lengths, machine.times.walkPerMetre)) * budget.batch;
  return floor < keeper.worst() ? { groups, pieces, setup, floor } : null;
}

/** mm. Some station holds the bend with the longest line, however it is made; what may stay uncovered taken off. */
function longestNeeded({ situation: { moves, part, machine } }: BedQuestion): number {
  const lines = part.bends.map((_, bend) => Math.min(...moves.filter(({ bends }) => bends.includes(bend)).map(({ halfLength }) => 2 * halfLength)));
  return Math.max(0, ...lines) - 2 * machine.settings.maxUncoveredEnd - NOISE_MM;
}

/** Every station is walked to at least once, the nearest two standing near each other. */
function walkAtLeast(lengths: readonly number[], walkPerMetre: number): number {
  const [a = 0, b = 0] = [...lengths].sort((x, y) => x - y);
  return (lengths.length - 1) * (((a + b) / 2 + NEAR_GAP_MM) / 1000) * walkPerMetre;
}
