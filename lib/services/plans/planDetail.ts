import { sheetFlatChanges } from "../flatChange/sheetFlatChanges";
import { sheetListItem } from "../sheets/sheetListItem";
import { visibleSheetStates } from "../sheets/visibleSheetStates";
import { lastCheck } from "./lastCheck";
import { machineOf } from "./machineOf";
import { planListItem } from "./planListItem";
import { toolToDocument } from "@/bending/tooling/toolToDocument";
import type { Connection } from "@/db/connection";
import { findPlan } from "@/db/plans/findPlan";
import { findSheets } from "@/db/sheets/findSheets";
import type { Role } from "@/lib/schemas/role";
import type { PlanDetail } from "@/lib/schemas/views";

const SHEETS_SHOWN = 50;

export async function planDetail(db: Connection, role: Role, id: string): Promise<PlanDetail | undefined> {
  const row = await findPlan(db, id);
  if (!row) return undefined;
  const sheets = await findSheets(db, visibleSheetStates(role), { planId: id, sort: "createdAt", dir: "desc", page: 1, pageSize: SHEETS_SHOWN });
  const changes = await sheetFlatChanges(db, sheets.rows.map((sheet) => sheet.id));
  return {
    ...planListItem(row),
    plan: row.plan,
    document: row.part_document,
    material: row.material,
    machineId: row.machine_id,
    machineDocument: row.machine_document,
    machineModel: machineOf(row.machine_document),
    tooling: { format: "tooling/1", units: "mm", tools: row.tools.map(toolToDocument) },
    tools: row.tools,
    fromPlanId: row.from_plan_id,
    ended: row.ended,
    limitSeconds: row.limit_ms / 1000,
    lastCheck: await lastCheck(db, id),
    sheets: sheets.rows.map((sheet) => sheetListItem(sheet, changes.get(sheet.id))),
  };
}
