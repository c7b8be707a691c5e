import type { Knex } from "knex";
import type { Connection } from "../connection";
import type { SheetRowState } from "./sheetRow";

/** Sheets in the states that the reader may see, joined with what they are of. */
export const sheetQuery = (db: Connection, visible: readonly SheetRowState[]): Knex.QueryBuilder =>
  db("sheets as sheet")
    .join("plans as plan", "plan.id", "sheet.plan_id")
    .join("parts as part", "part.id", "sheet.part_id")
    .join("part_revisions as revision", "revision.id", "plan.revision_id")
    .join("machines as machine", "machine.id", "sheet.machine_id")
    .leftJoin("users as releaser", "releaser.id", "sheet.released_by")
    .whereIn("sheet.state", visible);

export const sheetListColumns: readonly string[] = [
  "sheet.id", "sheet.number", "sheet.state", "part.number as part_number", "revision.name as part_name", "revision.revision", "sheet.machine_id",
  "machine.name as machine_name", "revision.bends", "plan.batch", "sheet.plan_id", "sheet.part_id", "sheet.released_at",
  "releaser.name as released_by", "sheet.created_at",
];
