import type { Connection } from "../connection";

export interface NewSheet {
  readonly planId: string;
  readonly partId: string;
  readonly machineId: string;
  readonly by: string | null;
}

/** A draft. */
export async function insertSheet(db: Connection, sheet: NewSheet): Promise<{ readonly id: string; readonly number: string }> {
  const [row] = await db("sheets")
    .insert({ plan_id: sheet.planId, part_id: sheet.partId, machine_id: sheet.machineId, created_by: sheet.by })
    .returning<{ id: string; number: string }[]>(["id", "number"]);
  return row!;
}
