import type { OrderProblem } from "../order/orderProblem";
import { NEAR_GAP_MM } from "../setup/placeStations";
import type { BedQuestion } from "./bedQuestion";
import type { KindClass } from "./kindClasses";

/**
 * The order question for stations of these classes, each as if alone on the bed and all as near as they may stand:
 * no bed of them is better.
 */
export function aloneProblem({ situation: { moves, part, machine }, alone }: BedQuestion, classes: readonly KindClass[]): OrderProblem {
  return {
    bends: part.bends.length,
    moves,
    stations: classes.length,
    times: machine.times,
    walk: (from, to) => {
      const [a, b] = [classes[from]?.shortest ?? 0, classes[to]?.shortest ?? 0];
      return (((a + b) / 2 + NEAR_GAP_MM) / 1000) * machine.times.walkPerMetre;
    },
    option: (move, formed, station) => {
      const one = classes[station];
      const kind = one?.kinds[0];
      if (one === undefined || kind === undefined) return null;
      const need = alone.need(move, formed, one.pair);
      return need !== null && alone.holds(kind, need) ? alone.option(move, formed, one.pair) : null;
    },
  };
}
