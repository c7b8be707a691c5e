import type { StoredPlan } from "@/bending/plan/storedPlan";
import type { ShopNow } from "@/bending/plan/storedPlan";
import type { PlanTask } from "./planTask";

/** Work for the planning thread, as plain data. `limitMs`: when it stops with what it has. */
export type JobTask =
  | { readonly kind: "plan"; readonly limitMs: number; readonly task: PlanTask }
  | { readonly kind: "check"; readonly limitMs: number; readonly stored: StoredPlan; readonly now: ShopNow };
