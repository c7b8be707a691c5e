import type { JobAnswer } from "./jobAnswer";
import type { JobTask } from "./jobTask";
import { runPlanTask, type Listener } from "./runPlanTask";
import { verifyStored } from "@/bending/plan/verifyStored";

/** Does a task in this thread, however long that takes. */
export function runJobTask(task: JobTask, listener: Listener): JobAnswer {
  switch (task.kind) {
    case "plan": return { kind: "plan", ...runPlanTask(task.task, listener) };
    case "check": return { kind: "check", check: verifyStored(task.stored, task.now) };
    default: return task satisfies never;
  }
}
