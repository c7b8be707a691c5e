import type { JobAnswer } from "./jobAnswer";
import type { JobTask } from "./jobTask";
import type { PlanProgress } from "@/bending/plan/planRequest";

/** What the planning thread is given. `finish` is shared memory: 1 there asks it to end with the best so far. */
export interface PlanWorkerData {
  readonly task: JobTask;
  readonly finish: Int32Array<SharedArrayBuffer>;
}

/** What the planning thread says. */
export type PlanWorkerMessage =
  | { readonly kind: "progress"; readonly progress: PlanProgress }
  | { readonly kind: "done"; readonly answer: JobAnswer };
