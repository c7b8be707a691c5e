import { contains } from "../contains";
import type { Connection } from "../connection";
import type { PageRequest, PageRows } from "../page";
import { pageOf } from "../pageOf";
import { sheetListColumns, sheetQuery } from "./sheetQuery";
import type { SheetListRow, SheetRowState } from "./sheetRow";

const columns = {
  number: "sheet.number",
  state: "sheet.state",
  partNumber: "part.number",
  partName: "revision.name",
  machine: "machine.name",
  bends: "revision.bends",
  releasedAt: "sheet.released_at",
  createdAt: "sheet.created_at",
} as const;
export type SheetSort = keyof typeof columns;

export interface SheetFilter {
  readonly state?: SheetRowState | undefined;
  readonly machineId?: string | undefined;
  readonly planId?: string | undefined;
}

export async function findSheets(
  db: Connection,
  visible: readonly SheetRowState[],
  request: PageRequest<SheetSort> & SheetFilter,
): Promise<PageRows<SheetListRow>> {
  const filtered = sheetQuery(db, visible);
  if (request.state) void filtered.where("sheet.state", request.state);
  if (request.machineId) void filtered.where("sheet.machine_id", request.machineId);
  if (request.planId) void filtered.where("sheet.plan_id", request.planId);
  if (request.q) {
    const pattern = contains(request.q);
    void filtered.where((any) =>
      any.whereILike("sheet.number", pattern).orWhereILike("part.number", pattern).orWhereILike("revision.name", pattern)
        .orWhereILike("machine.name", pattern));
  }
  return pageOf<SheetListRow, SheetSort>(filtered, sheetListColumns, columns, request, "sheet.id");
}
