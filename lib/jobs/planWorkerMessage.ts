import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanProgress } from "@/bending/plan/planRequest";

/** What the planning thread says. */
export type PlanWorkerMessage =
  | { readonly kind: "progress"; readonly progress: PlanProgress }
  | { readonly kind: "done"; readonly plan: PlanDocument };
