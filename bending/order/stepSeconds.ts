import { handlingBetween } from "./handlingBetween";
import { handlingSeconds } from "./handlingSeconds";
import { ANY_GAUGE, type OrderProblem } from "./orderProblem";

export interface StepBefore {
  readonly move: number;
  readonly station: number;
  readonly gauge: number;
}

/** Seconds of one step: handle, walk, move the gauge, stroke (twice where a move takes two). The first step of a part sets the gauge anew. */
export function stepSeconds(problem: OrderProblem, before: StepBefore | null, step: StepBefore): number {
  const { times } = problem;
  const to = moveOf(problem, step.move);
  const strokes = (to.strokes ?? 1) * times.stroke;
  if (before === null) return times.gaugeMove + strokes;
  return handlingSeconds(handlingBetween(moveOf(problem, before.move).pose, to.pose), times)
    + (before.station === step.station ? 0 : problem.walk(before.station, step.station))
    + (before.gauge === step.gauge || before.gauge === ANY_GAUGE || step.gauge === ANY_GAUGE ? 0 : times.gaugeMove)
    + strokes;
}

function moveOf(problem: OrderProblem, move: number) {
  const found = problem.moves[move];
  if (found === undefined) throw new Error(`invariant: move ${move} is not one of the problem's`);
  return found;
}
