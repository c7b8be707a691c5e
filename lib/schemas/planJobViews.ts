import type { PlanChange } from "@/bending/plan/planChange";
import type { PlanFailure } from "@/bending/plan/planFailure";
import type { PlanRobustness } from "@/bending/plan/planRobustness";
import type { StoredCheck } from "@/bending/plan/storedPlan";

/** A stored plan looked over again: what came of it, when and by whom. */
export interface PlanCheckView extends StoredCheck {
  readonly checkedAt: string;
  readonly checkedBy: string;
}

/** What a job found that is not a plan of its own. */
export type PlanJobResult =
  | { readonly kind: "check"; readonly check: PlanCheckView }
  | {
    readonly kind: "why";
    readonly firstFailure: PlanFailure | null;
    readonly changes: readonly PlanChange[];
    /** Plans made for it; false: the time ended it before every kind of change was tried. */
    readonly plans: number;
    readonly complete: boolean;
    /** The person's own order that it is about; null: the plan itself. */
    readonly order: readonly string[] | null;
  }
  | { readonly kind: "firm"; readonly robustness: PlanRobustness };

/** Planning runs in the background: what starts it answers 202 with one of these; GET /api/plan-jobs/[id] follows it. */
export interface PlanJobView {
  readonly id: string;
  readonly kind: "plan" | "check" | "why" | "firm";
  /** "P-1001 rev 2 on Brake 1". */
  readonly subject: string;
  readonly partId: string;
  /** The plan that it is about; null: the part is planned afresh. */
  readonly fromPlanId: string | null;
  readonly by: string;
  readonly startedAt: string;
  readonly state: "running" | "done" | "failed" | "cancelled";
  /** 0..1, or null when unknown. */
  readonly progress: number | null;
  readonly message: string;
  readonly planId: string | null;
  readonly result: PlanJobResult | null;
}
