import type { PlanTolerance } from "@/bending/plan/planTolerance";

/** Whether a tolerance that is asked for is kept; null when none is. */
export function toleranceState({ asked, worstCase, statistical }: Pick<PlanTolerance, "asked" | "worstCase" | "statistical">): { readonly tone: "good" | "caution" | "stop"; readonly word: string } | null {
  if (asked === undefined) return null;
  if (worstCase !== null && worstCase <= asked) return { tone: "good", word: "kept" };
  return statistical !== null && statistical <= asked ? { tone: "caution", word: "mostly kept" } : { tone: "stop", word: "not kept" };
}
