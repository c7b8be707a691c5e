import type { PlanTask } from "./planTask";
import type { PlanEnd } from "@/bending/plan/planEnd";
import { checkOrder } from "@/bending/plan/checkOrder";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import type { PlanProgress } from "@/bending/plan/planRequest";

export interface Listener {
  readonly onProgress: (progress: PlanProgress) => void;
  /** True when a person wants the best so far now. */
  readonly finishAsked: () => boolean;
}

/** Between two reports of progress. */
const REPORT_MS = 150;

/** Plans in this thread, however long that takes, and stops with the best so far at the task's limit or when asked to. */
export function runPlanTask(task: PlanTask, { onProgress, finishAsked }: Listener): { readonly plan: PlanDocument; readonly ended: PlanEnd } {
  const { material, limitMs, order, ...request } = task;
  const started = Date.now();
  let reported = 0;
  let ended: PlanEnd = "itself";
  const asked = {
    ...request,
    materials: (id: string) => (id === material.id ? material : undefined),
    now: () => performance.now(),
    shouldStop: () => {
      if (ended === "itself" && finishAsked()) ended = "person";
      else if (ended === "itself" && Date.now() - started > limitMs) ended = "limit";
      return ended !== "itself";
    },
    onProgress: (progress: PlanProgress) => {
      if (Date.now() - reported < REPORT_MS) return;
      reported = Date.now();
      onProgress(progress);
    },
  };
  const plan = order === undefined ? planPart(asked) : checkOrder({ ...asked, order });
  return { plan, ended: settled(plan) ? "itself" : ended };
}

/** A proof that came as the time ran out is a proof. */
const settled = ({ status }: PlanDocument): boolean => status === "optimal" || status === "infeasible";
