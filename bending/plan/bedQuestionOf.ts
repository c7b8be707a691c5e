import type { BedQuestion } from "./bedQuestion";
import { createAlone } from "./createAlone";
import type { CandidateKeeper } from "./createCandidateKeeper";
import type { SearchBudget } from "./createBudget";
import type { StepChecks } from "./createStepChecks";
import type { GaugeNumbers } from "./gaugeNumbers";
import type { Situation } from "./situation";
import type { UnhinderedOrder } from "./unhindered";

/** The question about beds, with what the unhindered order tells when it is known. */
export function bedQuestionOf(
  situation: Situation, checks: StepChecks, numbers: GaugeNumbers, budget: SearchBudget, keeper: CandidateKeeper,
  best: Extract<UnhinderedOrder, { kind: "found" }> | null,
): BedQuestion {
  return {
    situation, checks, numbers, budget, keeper,
    alone: createAlone(situation, checks, numbers),
    least: best?.weight ?? 0,
    favoured: new Set((best?.steps ?? []).flatMap(({ move, formed }) => {
      const pair = situation.pairs.find(({ index }) => checks.possible(move, formed, index));
      return pair === undefined ? [] : [pair.index];
    })),
    sets: best?.sets ?? null,
    limits: { shouldStop: budget.shouldStop, onExpand: budget.onExpand, ...best?.better },
  };
}
