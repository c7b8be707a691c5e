import type { Knex } from "knex";
import type { Connection } from "../connection";
import { contains } from "../contains";
import type { PageRequest, PageRows } from "../page";
import { pageOf } from "../pageOf";
import { trialColumns, trialQuery } from "./trialQuery";
import type { TrialRow } from "./trialRow";

const columns = {
  number: "number_order",
  material: "trial.material_id",
  batch: "trial.batch",
  thickness: "trial.nominal_thickness_mm",
  vOpening: "trial.v_opening_mm",
  punchRadius: "trial.punch_radius_mm",
  angle: "trial.angle_deg",
  measuredOn: "trial.measured_on",
  measuredBy: "trial.measured_by",
} as const;
export type TrialSort = keyof typeof columns;

export interface TrialFilter {
  readonly material?: string | undefined;
  readonly state?: "counted" | "excluded" | "withdrawn" | undefined;
}

/** Trials, withdrawn ones too; `q` is looked for in number, material, batch, who measured and the note. */
export async function findTrials(db: Connection, request: PageRequest<TrialSort> & TrialFilter): Promise<PageRows<TrialRow>> {
  const filtered: Knex.QueryBuilder = trialQuery(db);
  if (request.material) void filtered.where("trial.material_id", request.material);
  if (request.state === "withdrawn") void filtered.whereNotNull("trial.withdrawn_at");
  if (request.state === "excluded") void filtered.whereNull("trial.withdrawn_at").whereNotNull("trial.excluded_at");
  if (request.state === "counted") void filtered.whereNull("trial.withdrawn_at").whereNull("trial.excluded_at");
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) =>
      ["trial.number", "trial.material_id", "trial.batch", "trial.measured_by", "trial.note"].forEach((column) => any.orWhereILike(column, pattern)));
  }
  return pageOf<TrialRow, TrialSort>(filtered, trialColumns(db), columns, request, "trial.id");
}
