import type { StepChecks } from "./createStepChecks";
import type { Situation } from "./situation";

/**
 * What several plans of one request share that differ in their time settings and batch only: no question of geometry depends on them.
 * Begin with empty maps; never use it for a request of other tools, another part or other settings.
 */
export interface PlanMemory {
  /** By the flat's place among the variants. */
  readonly situations: Map<number, Situation>;
  readonly checks: Map<string, StepChecks>;
}

export const createPlanMemory = (): PlanMemory => ({ situations: new Map(), checks: new Map() });
