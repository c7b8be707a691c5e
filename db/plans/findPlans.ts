import { contains } from "../contains";
import type { Connection } from "../connection";
import type { PageRequest, PageRows } from "../page";
import { pageOf } from "../pageOf";
import { planListColumns, planQuery } from "./planQuery";
import type { PlanListRow } from "./planRow";

const columns = {
  partNumber: "part.number",
  partName: "revision.name",
  machine: "machine.name",
  status: "plan.status",
  batch: "plan.batch",
  steps: "plan.steps",
  secondsPerPart: "plan.seconds_per_part",
  createdAt: "plan.created_at",
} as const;
export type PlanSort = keyof typeof columns;

export interface PlanFilter {
  readonly partId?: string | undefined;
  readonly machineId?: string | undefined;
  readonly status?: string | undefined;
}

export async function findPlans(db: Connection, request: PageRequest<PlanSort> & PlanFilter): Promise<PageRows<PlanListRow>> {
  const filtered = planQuery(db);
  if (request.partId) void filtered.where("plan.part_id", request.partId);
  if (request.machineId) void filtered.where("plan.machine_id", request.machineId);
  if (request.status) void filtered.where("plan.status", request.status);
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) =>
      any.whereILike("part.number", pattern).orWhereILike("revision.name", pattern).orWhereILike("machine.name", pattern));
  }
  return pageOf<PlanListRow, PlanSort>(filtered, planListColumns, columns, request, "plan.id");
}
