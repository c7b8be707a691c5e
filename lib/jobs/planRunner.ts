import type { JobAnswer } from "./jobAnswer";
import type { JobTask } from "./jobTask";
import type { PlanProgress } from "@/bending/plan/planRequest";

export interface PlanRun {
  readonly result: Promise<JobAnswer>;
  /** Ends it at once; `result` is rejected. */
  readonly stop: () => void;
  /** Has it come to its end with the best so far. */
  readonly finish: () => void;
}

export type PlanRunner = (task: JobTask, onProgress: (progress: PlanProgress) => void) => PlanRun;
