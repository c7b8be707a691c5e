import type { OrderProblem } from "../order/orderProblem";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { StationKind } from "../setup/stationKinds";
import type { BedQuestion } from "./bedQuestion";

/**
 * The order question for stations of these kinds, each as if alone on the bed and all as near as they may stand:
 * no bed of them is better.
 */
export function aloneProblem({ situation: { moves, part, machine }, alone, relaxed }: BedQuestion, kinds: readonly StationKind[]): OrderProblem {
  return {
    bends: part.bends.length,
    moves,
    stations: kinds.length,
    times: machine.times,
    walk: (from, to) => (((kinds[from]?.length ?? 0) + (kinds[to]?.length ?? 0)) / 2 + NEAR_GAP_MM) / 1000 * machine.times.walkPerMetre,
    least: relaxed.least,
    option: (move, formed, station) => {
      const kind = kinds[station];
      if (kind === undefined) return null;
      const need = alone.need(move, formed, kind.pair);
      return need !== null && alone.holds(kind, need) ? alone.option(move, formed, kind.pair) : null;
    },
  };
}
