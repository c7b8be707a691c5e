import { completeMaterial } from "@/bending/handbook/completeMaterial";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "../connection";
import { planListColumns, planQuery } from "./planQuery";
import type { PlanListRow } from "./planRow";

/** A plan with everything that it was made of, as it was. */
export interface PlanRow extends PlanListRow {
  readonly plan: PlanDocument;
  readonly part_document: PartDocument;
  readonly material: MaterialFacts;
  /** The recorded version that `material` is; null for plans from before versions were kept. */
  readonly material_version_id: string | null;
  readonly machine_document: unknown;
  readonly tools: readonly Tool[];
}

export async function findPlan(db: Connection, id: string): Promise<PlanRow | undefined> {
  const rows: PlanRow[] = await planQuery(db)
    .where("plan.id", id)
    .select([...planListColumns, "plan.document as plan", "revision.document as part_document", "plan.material", "plan.material_version_id", "plan.machine_document", "plan.tools"]);
  const [row] = rows;
  return row && { ...row, material: completeMaterial(row.material) };
}
