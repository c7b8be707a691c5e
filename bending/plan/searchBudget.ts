import type { PlanProgress } from "./planRequest";

/** How far a search may go, shared by everything that one plan tries. */
export interface SearchBudget {
  readonly shouldStop: () => boolean;
  readonly onProgress: (progress: PlanProgress) => void;
  readonly batch: number;
  /** How many plans are wanted, the best among them. */
  readonly keep: number;
}
