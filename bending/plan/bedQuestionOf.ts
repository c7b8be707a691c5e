import type { OrderStep } from "../order/orderProblem";
import type { LearningProblem } from "../order/searchLearning";
import type { SearchLimits } from "../order/searchOrder";
import type { BedQuestion } from "./bedQuestion";
import { createAlone } from "./createAlone";
import type { CandidateKeeper } from "./createCandidateKeeper";
import type { SearchBudget } from "./createBudget";
import type { StepChecks } from "./createStepChecks";
import type { GaugeNumbers } from "./gaugeNumbers";
import type { Situation } from "./situation";

/** The question about beds, with the order found with the bed left out and the weight that no order goes below. */
export function bedQuestionOf(
  { situation, checks, numbers }: { readonly situation: Situation; readonly checks: StepChecks; readonly numbers: GaugeNumbers }, relaxed: LearningProblem,
  budget: SearchBudget, keeper: CandidateKeeper, best: { readonly steps: readonly OrderStep[]; readonly least: number; readonly soFar: SearchLimits["soFar"] },
): BedQuestion {
  return {
    situation, checks, numbers, budget, keeper, relaxed,
    alone: createAlone(situation, checks, numbers),
    least: best.least,
    favoured: new Set(best.steps.flatMap(({ move, formed }) => {
      const pair = situation.pairs.find(({ index }) => checks.possible(move, formed, index));
      return pair === undefined ? [] : [pair.index];
    })),
    limits: { shouldStop: budget.shouldStop, onExpand: budget.onExpand, soFar: best.soFar ?? null },
  };
}
