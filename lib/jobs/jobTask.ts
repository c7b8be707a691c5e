import type { PlanDocument } from "@/bending/plan/planDocument";
import type { ShopNow, StoredPlan } from "@/bending/plan/storedPlan";
import type { PlanTask } from "./planTask";

/**
 * Work for the planning thread, as plain data. `limitMs`: when it stops with what it has. `why`: the least changes with which there is a plan
 * (`plan`: the answer that has none, when it is known); `firm`: how far the time settings may be off.
 */
export type JobTask =
  | { readonly kind: "plan"; readonly limitMs: number; readonly task: PlanTask }
  | { readonly kind: "check"; readonly limitMs: number; readonly stored: StoredPlan; readonly now: ShopNow }
  | { readonly kind: "why"; readonly limitMs: number; readonly task: PlanTask; readonly plan: PlanDocument | null }
  | { readonly kind: "firm"; readonly limitMs: number; readonly task: PlanTask; readonly plan: PlanDocument };
