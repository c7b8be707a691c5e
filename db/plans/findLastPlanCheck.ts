import type { StoredCheck } from "@/bending/plan/storedPlan";
import type { Connection } from "../connection";

export interface PlanCheckRow {
  readonly document: StoredCheck;
  readonly checked_at: Date;
  readonly checked_by: string | null;
}

/** The newest time that a plan was looked over again. */
export async function findLastPlanCheck(db: Connection, planId: string): Promise<PlanCheckRow | undefined> {
  return db("plan_checks as look")
    .leftJoin("users as author", "author.id", "look.checked_by")
    .where("look.plan_id", planId)
    .orderBy("look.checked_at", "desc")
    .first<PlanCheckRow | undefined>("look.document", "look.checked_at", "author.name as checked_by");
}
