import type { BendWish } from "@/bending/plan/bendWish";
import { planAlternatives } from "@/lib/schemas/planInputs";

/** What a plan was asked for beside part, machine, batch and time: kept with it, to search on with. */
export interface PlanAsked {
  readonly alternatives: number;
  /** Whether pieces that stand at another brake may be fetched. */
  readonly otherBrakes: boolean;
  readonly order?: readonly string[];
  readonly wishes?: readonly BendWish[];
}

/** As it was kept; plans of before it was kept took pieces wherever they stood. */
export function planAsked(kept: unknown): PlanAsked {
  return { alternatives: planAlternatives.usual, otherBrakes: true, ...(kept as Partial<PlanAsked>) };
}
