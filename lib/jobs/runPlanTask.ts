import { createWatch, type Listener } from "./createWatch";
import type { PlanTask } from "./planTask";
import { requestOf } from "./requestOf";
import { checkOrder } from "@/bending/plan/checkOrder";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanEnd } from "@/bending/plan/planEnd";
import { planPart } from "@/bending/plan/planPart";

/** Plans in this thread, however long that takes, and stops with the best so far at the task's limit or when asked to. */
export function runPlanTask(task: PlanTask, listener: Listener): { readonly plan: PlanDocument; readonly ended: PlanEnd } {
  const { shouldStop, onProgress, ended } = createWatch(task.limitMs, listener);
  const asked = { ...requestOf(task), now: () => performance.now(), shouldStop, onProgress };
  const plan = "order" in asked ? checkOrder(asked) : planPart(asked);
  return { plan, ended: settled(plan) ? "itself" : ended() };
}

/** A proof that came as the time ran out is a proof. */
const settled = ({ status }: PlanDocument): boolean => status === "optimal" || status === "infeasible";
