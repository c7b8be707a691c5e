import type { Connection } from "@/db/connection";
import { findLastPlanCheck } from "@/db/plans/findLastPlanCheck";
import type { PlanCheckView } from "@/lib/schemas/planJobViews";

/** When a plan was last looked over again, and what came of it; null: never. */
export async function lastCheck(db: Connection, planId: string): Promise<PlanCheckView | null> {
  const row = await findLastPlanCheck(db, planId);
  return row ? { ...row.document, checkedAt: row.checked_at.toISOString(), checkedBy: row.checked_by ?? "" } : null;
}
