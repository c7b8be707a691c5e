import { DEMERIT_SECONDS, type OrderProblem, type OrderStep } from "./orderProblem";
import { stepSeconds, type StepBefore } from "./stepSeconds";

export interface EveryOrderAnswer {
  readonly steps: readonly OrderStep[];
  readonly weight: number;
  readonly orders: number;
}

/** The slow and obvious reference: every permutation of moves at every station, nothing remembered, nothing cut off. */
export function everyOrder(problem: OrderProblem): EveryOrderAnswer | null {
  const all = 2 ** problem.bends - 1;
  let best: EveryOrderAnswer | null = null;
  let orders = 0;
  const steps: OrderStep[] = [];
  const walk = (formed: number, before: StepBefore | null, weight: number): void => {
    if (formed === all) {
      orders += 1;
      if (best === null || weight < best.weight) best = { steps: [...steps], weight, orders };
      return;
    }
    problem.moves.forEach((candidate, move) => {
      if (candidate.mask & formed) return;
      for (let station = 0; station < problem.stations; station += 1) {
        const option = problem.option(move, formed, station);
        if (option === null) continue;
        const step = { move, station, gauge: option.gauge };
        steps.push({ move, station, formed });
        walk(formed | candidate.mask, step, weight + stepSeconds(problem, before, step) + option.demerit * DEMERIT_SECONDS);
        steps.pop();
      }
    });
  };
  walk(0, null, 0);
  return best === null ? null : { ...(best as EveryOrderAnswer), orders };
}
