import type { PlanEnd } from "@/bending/plan/planEnd";
import type { PlanProgress } from "@/bending/plan/planRequest";

export interface Listener {
  readonly onProgress: (progress: PlanProgress) => void;
  /** True when a person wants the best so far now. */
  readonly finishAsked: () => boolean;
}

export interface Watch {
  readonly shouldStop: () => boolean;
  readonly onProgress: (progress: PlanProgress) => void;
  /** What has ended the work; `itself` while nothing has. */
  readonly ended: () => PlanEnd;
}

/** Between two reports of progress. */
const REPORT_MS = 150;

/** Watches the clock and the person for work that runs on: once ended it stays ended. Progress is passed on now and then. */
export function createWatch(limitMs: number, { onProgress, finishAsked }: Listener): Watch {
  const started = Date.now();
  let reported = 0;
  let ended: PlanEnd = "itself";
  return {
    shouldStop: () => {
      if (ended === "itself" && finishAsked()) ended = "person";
      else if (ended === "itself" && Date.now() - started > limitMs) ended = "limit";
      return ended !== "itself";
    },
    onProgress: (progress) => {
      if (Date.now() - reported < REPORT_MS) return;
      reported = Date.now();
      onProgress(progress);
    },
    ended: () => ended,
  };
}
