import type { PlanRequest } from "./planRequest";

/** How far a search may go, shared by everything that one plan tries. */
export interface SearchBudget {
  /** Asked often, from the innermost questions too; says how far the search is. Once true it stays true. */
  readonly shouldStop: () => boolean;
  /** What is being done, and how many states were looked at before it began. */
  readonly doing: (message: string, expanded: number) => void;
  readonly onExpand: (expanded: number) => void;
  readonly batch: number;
  /** How many plans are wanted, the best among them. */
  readonly keep: number;
  /** The first plan is enough. */
  readonly firstPlan: boolean;
}

/** Progress is said once in so many asks: they come by the ten thousand a second. */
const SAY_EVERY = 32;

export function createBudget(request: PlanRequest): SearchBudget {
  const ask = request.shouldStop ?? (() => false);
  let [asked, before, expanded, stopped] = [0, 0, 0, false];
  let message = "Asking what clears";
  const say = () => request.onProgress?.({ expanded: before + expanded, fraction: null, message });
  return {
    shouldStop: () => {
      if (asked % SAY_EVERY === 0) say();
      asked += 1;
      stopped ||= ask();
      return stopped;
    },
    doing: (what, states) => {
      [message, before, expanded] = [what, states, 0];
      say();
    },
    onExpand: (count) => { expanded = count; },
    batch: request.batch,
    keep: 1 + (request.alternatives ?? 0),
    firstPlan: request.firstPlan ?? false,
  };
}
