import type { PlanTask } from "@/lib/jobs/planTask";

/** What the question of a plan stands on today. */
export interface PlanShopView {
  readonly task: PlanTask;
  /** True: the same as when it was planned. */
  readonly asPlanned: boolean;
}
