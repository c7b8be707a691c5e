import { DEMERIT_SECONDS, type OrderProblem, type OrderStep } from "./orderProblem";
import { remainingBound } from "./remainingBound";
import { stepSeconds, type StepBefore } from "./stepSeconds";

export interface DivedOrder {
  readonly steps: readonly OrderStep[];
  readonly seconds: number;
  readonly demerits: number;
  readonly weight: number;
}

interface Child { readonly step: StepBefore; readonly next: number; readonly seconds: number; readonly demerit: number; readonly total: number }

/**
 * A first order, fast: always the step that looks cheapest, back where it ends, sets that were found to lead
 * nowhere not entered again; null when none was found within `most` states (which proves nothing).
 */
export function diveOrder(problem: OrderProblem, most: number, shouldStop: () => boolean): DivedOrder | null {
  const all = 2 ** problem.bends - 1;
  const bound = remainingBound(problem);
  const dead = new Set<number>();
  const steps: OrderStep[] = [];
  let entered = 0;
  let answer: DivedOrder | null = null;

  const enter = (formed: number, before: StepBefore | null, seconds: number, demerits: number): boolean => {
    if (formed === all) {
      answer = { steps: [...steps], seconds, demerits, weight: seconds + demerits * DEMERIT_SECONDS };
      return true;
    }
    entered += 1;
    if (entered > most) return false;
    for (const child of childrenOf(problem, formed, before, all, bound, shouldStop)) {
      if (dead.has(child.next)) continue;
      steps.push({ move: child.step.move, station: child.step.station, formed });
      if (enter(child.next, child.step, seconds + child.seconds, demerits + child.demerit)) return true;
      steps.pop();
      if (entered > most || shouldStop()) return false;
    }
    dead.add(formed);
    return false;
  };
  enter(0, null, 0, 0);
  return answer;
}

function childrenOf(problem: OrderProblem, formed: number, before: StepBefore | null, all: number, bound: ReturnType<typeof remainingBound>, shouldStop: () => boolean): readonly Child[] {
  const children: Child[] = [];
  problem.moves.forEach(({ mask, pose }, move) => {
    if (mask & formed || shouldStop()) return;
    for (let station = 0; station < problem.stations; station += 1) {
      const option = problem.option(move, formed, station);
      if (option === null) continue;
      const step = { move, station, gauge: option.gauge };
      const seconds = stepSeconds(problem, before, step);
      const next = formed | mask;
      children.push({ step, next, seconds, demerit: option.demerit, total: seconds + option.demerit * DEMERIT_SECONDS + bound(all & ~next, pose) });
    }
  });
  return children.sort((a, b) => a.total - b.total);
}
