import type { LearningProblem } from "../order/searchLearning";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { StationKind } from "../setup/stationKinds";
import type { BedQuestion } from "./bedQuestion";

/**
 * The order question for stations of these kinds, each as if alone on the bed and all as near as they may stand:
 * no bed of them is better.
 */
export function aloneProblem({ situation: { moves, part, machine }, alone, relaxed }: BedQuestion, kinds: readonly StationKind[]): LearningProblem {
  return {
    bends: part.bends.length,
    moves,
    stations: kinds.length,
    times: machine.times,
    walk: (from, to) => (((kinds[from]?.length ?? 0) + (kinds[to]?.length ?? 0)) / 2 + NEAR_GAP_MM) / 1000 * machine.times.walkPerMetre,
    least: (move, formed) => (kinds.every((kind) => alone.cannot(kind, move, formed)) ? null : relaxed.least(move, formed)),
    learned: () => kinds.reduce((sum, kind) => sum + alone.learned(kind), relaxed.learned()),
    option: (move, formed, station) => {
      const kind = kinds[station];
      return kind !== undefined && alone.can(kind, move, formed) ? alone.option(move, formed, kind.pair) : null;
    },
  };
}
