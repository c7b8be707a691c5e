import { createWatch, type Listener } from "./createWatch";
import type { JobAnswer } from "./jobAnswer";
import type { JobTask } from "./jobTask";
import { requestOf } from "./requestOf";
import { runPlanTask } from "./runPlanTask";
import { verifyStored } from "@/bending/plan/verifyStored";
import { robustness } from "@/bending/whyNot/robustness";
import { whyNot } from "@/bending/whyNot/whyNot";

/** Does a task in this thread, however long that takes. */
export function runJobTask(task: JobTask, listener: Listener): JobAnswer {
  const watch = createWatch(task.limitMs, listener);
  switch (task.kind) {
    case "plan": return { kind: "plan", ...runPlanTask(task.task, listener) };
    case "check": return { kind: "check", check: verifyStored(task.stored, task.now) };
    case "why": return { kind: "why", why: whyNot(requestOf(task.task), task.plan ?? runPlanTask(task.task, listener).plan, watch) };
    case "firm": return { kind: "firm", robustness: robustness(requestOf(task.task), task.plan, watch) };
    default: return task satisfies never;
  }
}
