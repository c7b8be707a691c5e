import type { LearningProblem } from "../order/searchLearning";
import type { SearchLimits } from "../order/searchOrder";
import type { Alone } from "./createAlone";
import type { CandidateKeeper } from "./createCandidateKeeper";
import type { SearchBudget } from "./createBudget";
import type { StepChecks } from "./createStepChecks";
import type { GaugeNumbers } from "./gaugeNumbers";
import type { Situation } from "./situation";

/** What the search over beds knows when it begins. */
export interface BedQuestion {
  readonly situation: Situation;
  readonly checks: StepChecks;
  readonly numbers: GaugeNumbers;
  readonly alone: Alone;
  readonly budget: SearchBudget;
  readonly keeper: CandidateKeeper;
  /** The order question with the bed left out. */
  readonly relaxed: LearningProblem;
  /** Weight of one part in the unhindered order: no bed is better. */
  readonly least: number;
  /** Pairs that the unhindered order uses. */
  readonly favoured: ReadonlySet<number>;
  readonly limits: SearchLimits;
}
