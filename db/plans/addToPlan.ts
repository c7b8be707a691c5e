import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Connection } from "../connection";

/** Adds to a stored plan what was found about it later; what the plan says stays as it is. */
export async function addToPlan(db: Connection, id: string, found: Pick<PlanDocument, "firstFailure" | "changes"> | Pick<PlanDocument, "robustness">): Promise<void> {
  await db("plans").where({ id }).update({ document: db.raw("document || ?::jsonb", [JSON.stringify(found)]) });
}
