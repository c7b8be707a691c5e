import { planAsked } from "./planAsked";
import type { PlanQuestion } from "./planInputs";
import type { PlanRow } from "@/db/plans/findPlan";

/** The question that a stored plan answers, to be asked again of the shop as it is now. */
export function questionOf(row: PlanRow): PlanQuestion {
  return { partId: row.part_id, revision: row.revision, machineId: row.machine_id, batch: row.batch, limitSeconds: row.limit_ms / 1000, ...planAsked(row.asked) };
}
