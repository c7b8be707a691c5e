import { sheetFlatChanges } from "../flatChange/sheetFlatChanges";
import { foundAgain } from "../foundAgain";
import { currentPieces } from "./currentPieces";
import { sheetListItem } from "./sheetListItem";
import { sheetViewOf } from "./sheetViewOf";
import { visibleSheetStates } from "./visibleSheetStates";
import type { Connection } from "@/db/connection";
import { findPlan } from "@/db/plans/findPlan";
import { findSheet, type SheetRow } from "@/db/sheets/findSheet";
import type { Role } from "@/lib/schemas/role";
import type { SheetDetail } from "@/lib/schemas/views";
import type { SheetView } from "@/lib/sheet/sheetView";

/** A sheet that this role may see: frozen once released, worked out anew while it is a draft. */
export async function sheetDetail(db: Connection, role: Role, id: string): Promise<SheetDetail | undefined> {
  const row = await findSheet(db, visibleSheetStates(role), id);
  if (!row) return undefined;
  return {
    ...sheetListItem(row, (await sheetFlatChanges(db, [id])).get(id)),
    partId: row.part_id,
    machineId: row.machine_id,
    view: row.snapshot === null ? await draftView(db, row) : (row.snapshot as SheetView),
    latestRevision: row.latest_revision,
  };
}

async function draftView(db: Connection, row: SheetRow): Promise<SheetView> {
  const plan = foundAgain(await findPlan(db, row.plan_id));
  return sheetViewOf(row, plan, (await currentPieces(db, plan.plan, plan.tools)).tools);
}
