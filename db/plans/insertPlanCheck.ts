import type { StoredCheck } from "@/bending/plan/storedPlan";
import type { Connection } from "../connection";

/** Writes down that a plan was looked over again, and what came of it. */
export async function insertPlanCheck(db: Connection, planId: string, check: StoredCheck, by: string): Promise<void> {
  await db("plan_checks").insert({ plan_id: planId, engine: check.engine.now, holds: check.holds, document: JSON.stringify(check), checked_by: by });
}
