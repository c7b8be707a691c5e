import { DEMERIT_SECONDS, type OrderProblem, type OrderStep } from "./orderProblem";
import { stepSeconds, type StepBefore } from "./stepSeconds";

export interface FollowedOrder {
  readonly steps: readonly OrderStep[];
  readonly seconds: number;
  readonly demerits: number;
  readonly weight: number;
}

interface Way { readonly steps: readonly OrderStep[]; readonly before: StepBefore | null; readonly seconds: number; readonly demerits: number }

const weigh = ({ seconds, demerits }: { readonly seconds: number; readonly demerits: number }) => seconds + demerits * DEMERIT_SECONDS;

/** The best choice of stations for moves in a given order; null when some move has none. */
export function followOrder(problem: OrderProblem, moves: readonly number[]): FollowedOrder | null {
  let ways: readonly Way[] = [{ steps: [], before: null, seconds: 0, demerits: 0 }];
  let formed = 0;
  for (const move of moves) {
    const next: Way[] = [];
    for (let station = 0; station < problem.stations; station += 1) {
      const option = problem.option(move, formed, station);
      if (option === null) continue;
      const step = { move, station, gauge: option.gauge };
      const longer = ways.map((way): Way => ({
        steps: [...way.steps, { move, station, formed }],
        before: step,
        seconds: way.seconds + stepSeconds(problem, way.before, step),
        demerits: way.demerits + option.demerit,
      }));
      next.push(...longer.sort((a, b) => weigh(a) - weigh(b)).slice(0, 1));
    }
    ways = next;
    formed |= problem.moves[move]?.mask ?? 0;
  }
  const best = [...ways].sort((a, b) => weigh(a) - weigh(b))[0];
  return best === undefined ? null : { steps: best.steps, seconds: best.seconds, demerits: best.demerits, weight: weigh(best) };
}
