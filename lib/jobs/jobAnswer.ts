import type { PlanDocument } from "@/bending/plan/planDocument";
import type { StoredCheck } from "@/bending/plan/storedPlan";
import type { PlanEnd } from "@/bending/plan/planEnd";

/** What the planning thread comes to. */
export type JobAnswer =
  | { readonly kind: "plan"; readonly plan: PlanDocument; readonly ended: PlanEnd }
  | { readonly kind: "check"; readonly check: StoredCheck };
