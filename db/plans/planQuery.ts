import type { Knex } from "knex";
import type { Connection } from "../connection";

/** Plans joined with their part, revision and machine. */
export const planQuery = (db: Connection): Knex.QueryBuilder =>
  db("plans as plan")
    .join("parts as part", "part.id", "plan.part_id")
    .join("part_revisions as revision", "revision.id", "plan.revision_id")
    .join("machines as machine", "machine.id", "plan.machine_id")
    .leftJoin("users as author", "author.id", "plan.created_by");

export const planListColumns: readonly string[] = [
  "plan.id", "plan.part_id", "part.number as part_number", "revision.name as part_name", "revision.revision", "plan.machine_id",
  "machine.name as machine_name", "plan.status", "plan.batch", "plan.steps", "plan.stations", "plan.seconds_per_part", "plan.setup_seconds",
  "plan.origin",
  "plan.created_at", "author.name as created_by",
];
