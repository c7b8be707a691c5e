import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanEnd } from "@/bending/plan/planEnd";
import type { PlanRobustness } from "@/bending/plan/planRobustness";
import type { StoredCheck } from "@/bending/plan/storedPlan";
import type { WhyNot } from "@/bending/whyNot/whyNot";

/** What the planning thread comes to. */
export type JobAnswer =
  | { readonly kind: "plan"; readonly plan: PlanDocument; readonly ended: PlanEnd }
  | { readonly kind: "check"; readonly check: StoredCheck }
  | { readonly kind: "why"; readonly why: WhyNot }
  | { readonly kind: "firm"; readonly robustness: PlanRobustness };
