import type { PlanDocument } from "@/bending/plan/planDocument";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";

/** What a plan takes beside another, in words: the batch in all, and where the difference lies. Under half a second is none. */
export function timeDifference(than: PlanDocument, plan: Pick<PlanDocument, "seconds" | "batch" | "units">): string {
  const { time } = createSheetFormat(plan.units);
  const all = time(plan.seconds.total);
  if (than.steps.length === 0) return `A batch of ${plan.batch} takes ${all}.`;
  const by = plan.seconds.total - than.seconds.total;
  if (Math.abs(by) < 0.5) return `A batch of ${plan.batch} takes ${all}, as long as with this plan.`;
  const words = (seconds: number): string => `${time(Math.abs(seconds))} ${seconds > 0 ? "more" : "less"}`;
  const parts = [["setup", plan.seconds.setup - than.seconds.setup], ["each part", plan.seconds.perPart - than.seconds.perPart]] as const;
  const where = parts.flatMap(([name, seconds]) => (Math.abs(seconds) < 0.05 ? [] : [`${name} ${words(seconds)}`]));
  return `A batch of ${plan.batch} takes ${all}: ${words(by)} than with this plan${where.length === 0 ? "" : ` (${where.join(", ")})`}.`;
}
