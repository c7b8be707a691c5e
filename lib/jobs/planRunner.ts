import type { PlanTask } from "./planTask";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { PlanProgress } from "@/bending/plan/planRequest";

export interface PlanRun {
  readonly result: Promise<PlanDocument>;
  /** Ends it at once; `result` is rejected. */
  readonly stop: () => void;
}

export type PlanRunner = (task: PlanTask, onProgress: (progress: PlanProgress) => void) => PlanRun;
