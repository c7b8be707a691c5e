import type { MaterialFacts } from "@/bending/handbook/material";
import type { PartDocument } from "@/bending/part/partDocument";
import type { PlanDocument, PlanFlat } from "@/bending/plan/planDocument";
import type { Connection } from "../connection";

/** What a sheet's flat was computed from, without the rest of its plan. */
export interface SheetFlatRow {
  readonly id: string;
  readonly planned_at: Date;
  readonly units: PlanDocument["units"];
  readonly flat: PlanFlat;
  /** Each stroke's bends with the V of the die that forms them, mm. */
  readonly strokes: readonly { readonly bends: readonly string[]; readonly vOpening: number | null }[];
  readonly material: MaterialFacts;
  readonly part_document: PartDocument;
}

/** Of those given, the released ones: a draft follows its plan, and nobody works from a superseded sheet. */
export async function findSheetFlats(db: Connection, ids: readonly string[]): Promise<readonly SheetFlatRow[]> {
  if (ids.length === 0) return [];
  return db("sheets as sheet")
    .join("plans as plan", "plan.id", "sheet.plan_id")
    .join("part_revisions as revision", "revision.id", "plan.revision_id")
    .whereIn("sheet.id", [...ids])
    .where("sheet.state", "released")
    .select<SheetFlatRow[]>("sheet.id", "plan.created_at as planned_at", "plan.material", "revision.document as part_document",
      db.raw("plan.document ->> 'units' as units"), db.raw("plan.document -> 'flat' as flat"), db.raw(`(
        select coalesce(jsonb_agg(jsonb_build_object('bends', step -> 'bends', 'vOpening', (
          select tool -> 'vOpening' from jsonb_array_elements(plan.tools) tool where tool ->> 'kind' = 'die' and tool -> 'id' = step -> 'die' limit 1
        ))), '[]'::jsonb) from jsonb_array_elements(plan.document -> 'steps') step
      ) as strokes`));
}
