import { completeMaterial } from "@/bending/handbook/completeMaterial";
import type { MaterialFacts } from "@/bending/handbook/material";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PlanEnd } from "@/bending/plan/planEnd";
import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "../connection";
import { planListColumns, planQuery } from "./planQuery";
import type { PlanListRow } from "./planRow";

/** A plan with everything that it was made of, as it was. */
export interface PlanRow extends PlanListRow {
  readonly plan: PlanDocument;
  readonly revision_id: string;
  readonly part_document: PartDocument;
  readonly material: MaterialFacts;
  /** The recorded version that `material` is; null for plans from before versions were kept. */
  readonly material_version_id: string | null;
  readonly machine_document: unknown;
  readonly tools: readonly Tool[];
  readonly inputs_digest: string;
  readonly from_plan_id: string | null;
  readonly ended: PlanEnd;
  readonly limit_ms: number;
  readonly asked: unknown;
}

export async function findPlan(db: Connection, id: string): Promise<PlanRow | undefined> {
  const rows: PlanRow[] = await planQuery(db)
    .where("plan.id", id)
    .select([...planListColumns, "plan.document as plan", "revision.document as part_document", "plan.material", "plan.material_version_id", "plan.machine_document", "plan.tools",
      "plan.revision_id", "plan.inputs_digest", "plan.from_plan_id", "plan.ended", "plan.limit_ms", "plan.asked"]);
  const [row] = rows;
  return row && { ...row, material: completeMaterial(row.material) };
}
