import { ANY_GAUGE, type StepOption } from "../order/orderProblem";
import type { LearningProblem } from "../order/searchLearning";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { BedQuestion } from "./bedQuestion";
import type { KindFamily } from "./kindFamilies";
import type { KindGroup } from "./kindSets";

/** Kinds up to which it pays to ask of every state what is known of all of them. */
const KINDS_ASKED_FIRST = 6;

/**
 * The order question for stations of these groups, each as if alone on the bed, of the kind that suits the step, and all as
 * near as they may stand: no bed of them is better.
 */
export function aloneProblem({ situation: { moves, part, machine }, alone, relaxed, checks }: BedQuestion, groups: readonly KindGroup[]): LearningProblem {
  const kinds = groups.flatMap(({ families }) => families.map(({ best }) => best));
  const shortest = groups.map(({ families }) => Math.min(...families.map(({ best }) => best.length)));
  const known = new Map<number, StepOption | null>();
  const find = (families: readonly KindFamily[], move: number, formed: number): StepOption | null => {
    const wanted = relaxed.least(move, formed)?.demerit ?? 0;
    let found: StepOption | null = null;
    for (const { best: kind } of families) {
      if (found !== null && found.demerit <= wanted) break;
      if (!alone.can(kind, move, formed)) continue;
      const option = alone.option(move, formed, kind.pair);
      if (found === null || option.demerit < found.demerit) found = option;
    }
    const alike = found === null || families.every(({ best }) => best.pair === families[0]?.best.pair) || checks.gaugesAgree(move, formed);
    return found === null || alike ? found : { ...found, gauge: ANY_GAUGE };
  };
  return {
    bends: part.bends.length,
    moves,
    stations: groups.length,
    times: machine.times,
    walk: (from, to) => (((shortest[from] ?? 0) + (shortest[to] ?? 0)) / 2 + NEAR_GAP_MM) / 1000 * machine.times.walkPerMetre,
    least: (move, formed) => (kinds.length <= KINDS_ASKED_FIRST && kinds.every((kind) => alone.cannot(kind, move, formed)) ? null : relaxed.least(move, formed)),
    learned: () => (kinds.length <= KINDS_ASKED_FIRST ? kinds.reduce((sum, kind) => sum + alone.learned(kind), relaxed.learned()) : relaxed.learned()),
    option: (move, formed, station) => {
      const key = (formed * moves.length + move) * groups.length + station;
      const answer = known.get(key);
      if (answer !== undefined) return answer;
      const found = find(groups[station]?.families ?? [], move, formed);
      known.set(key, found);
      return found;
    },
  };
}
