import type { OrderProblem, StepOption } from "../order/orderProblem";
import type { Layout } from "../setup/layout";
import type { StepChecks } from "./createStepChecks";
import { gaugeDemerits } from "./gaugeDemerits";
import type { GaugeNumbers } from "./gaugeNumbers";
import { placeStep } from "./placeStep";
import type { Situation } from "./situation";

/** The order question on a bed that is set: every stroke at a station, all stations standing. */
export function layoutProblem(situation: Situation, checks: StepChecks, numbers: GaugeNumbers, layout: Layout): OrderProblem {
  const { moves, machine, part, allowed } = situation;
  const known = new Map<number, StepOption | null>();
  return {
    bends: part.bends.length,
    moves,
    stations: layout.stations.length,
    times: machine.times,
    walk: (from, to) => (Math.abs((layout.stations[from]?.z ?? 0) - (layout.stations[to]?.z ?? 0)) / 1000) * machine.times.walkPerMetre,
    option: (move, formed, station) => {
      const key = (formed * moves.length + move) * layout.stations.length + station;
      const answer = known.get(key);
      if (answer !== undefined) return answer;
      const place = allowed(move, formed) ? placeStep(situation, checks, layout, { move, formed, station }) : null;
      const option = place === null ? null : {
        gauge: numbers(place.gauge?.option),
        demerit: checks.wishes(move, layout.stations[station]?.pair ?? 0) + gaugeDemerits(place.gauge?.fingers.length ?? 0) + checks.unkept(move, formed, place.gauge?.option),
      };
      known.set(key, option);
      return option;
    },
  };
}
