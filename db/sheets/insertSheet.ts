import type { Connection } from "../connection";

export interface NewSheet {
  readonly planId: string;
  readonly partId: string;
  readonly machineId: string;
  readonly by: string | null;
}

/** A draft; when the plan has one already, that one. */
export async function insertSheet(db: Connection, sheet: NewSheet): Promise<{ readonly id: string; readonly number: string; readonly inserted: boolean }> {
  const [row] = await db("sheets")
    .insert({ plan_id: sheet.planId, part_id: sheet.partId, machine_id: sheet.machineId, created_by: sheet.by })
    .onConflict(db.raw("(plan_id) where state = 'draft'"))
    .ignore()
    .returning<{ id: string; number: string }[]>(["id", "number"]);
  if (row) return { ...row, inserted: true };
  const draft = await db<{ id: string; number: string; plan_id: string; state: string }>("sheets")
    .where({ plan_id: sheet.planId, state: "draft" })
    .first("id", "number");
  if (!draft) throw new Error("the draft of a plan vanished while it was looked for");
  return { ...draft, inserted: false };
}
