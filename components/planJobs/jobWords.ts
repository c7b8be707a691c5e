import type { PlanJobView } from "@/lib/schemas/views";

/** What a job does, and what ending it with the best so far is called; null: it has nothing before it is done. */
export const jobWords = {
  plan: { doing: "Planning", finish: "Stop and keep the best so far" },
  check: { doing: "Looking over", finish: null },
  why: { doing: "Looking for what would make it work:", finish: "Stop and keep what was found" },
  firm: { doing: "Looking how firm the plan is:", finish: "Stop and keep what was found" },
} as const satisfies Record<PlanJobView["kind"], { readonly doing: string; readonly finish: string | null }>;
