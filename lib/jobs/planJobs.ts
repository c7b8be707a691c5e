import { availableParallelism } from "node:os";
import { createPlanJobs, type PlanJobs } from "./createPlanJobs";
import { runInWorker } from "./runInWorker";

const store = globalThis as typeof globalThis & { foldwrightJobs?: PlanJobs };

/** The process's own jobs: one set, whatever is reloaded around it. One processor is left to the requests. */
export function planJobs(): PlanJobs {
  store.foldwrightJobs ??= createPlanJobs(runInWorker, {
    atOnce: Math.max(1, Math.min(4, availableParallelism() - 1)),
    quickAtOnce: 2,
    waitingMost: 20,
    rememberedMost: 200,
  });
  return store.foldwrightJobs;
}
