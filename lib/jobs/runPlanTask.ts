import type { PlanTask } from "./planTask";
import type { PlanDocument } from "@/bending/plan/planDocument";
import { planPart } from "@/bending/plan/planPart";
import type { PlanProgress } from "@/bending/plan/planRequest";

/** Between two reports of progress. */
const REPORT_MS = 150;

/** Plans in this thread, however long that takes, and stops with the best so far at the task's limit. */
export function runPlanTask(task: PlanTask, onProgress: (progress: PlanProgress) => void): PlanDocument {
  const { material, limitMs, ...request } = task;
  const started = Date.now();
  let reported = 0;
  return planPart({
    ...request,
    materials: (id) => (id === material.id ? material : undefined),
    now: () => performance.now(),
    shouldStop: () => Date.now() - started > limitMs,
    onProgress: (progress) => {
      if (Date.now() - reported < REPORT_MS) return;
      reported = Date.now();
      onProgress(progress);
    },
  });
}
