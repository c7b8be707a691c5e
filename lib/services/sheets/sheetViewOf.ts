import { machineOf } from "../plans/machineOf";
import type { PlanRow } from "@/db/plans/findPlan";
import type { SheetListRow } from "@/db/sheets/sheetRow";
import type { Tool } from "@/bending/tooling/tool";
import { buildSheetView } from "@/lib/sheet/buildSheetView";
import type { SheetView } from "@/lib/sheet/sheetView";

/** What a sheet says, from the plan as it was stored and the tools given. */
export function sheetViewOf(sheet: Pick<SheetListRow, "number">, plan: PlanRow, tools: readonly Tool[]): SheetView {
  return buildSheetView({
    plan: plan.plan,
    document: plan.part_document,
    material: plan.material,
    machine: machineOf(plan.machine_document),
    tools,
    part: { number: plan.part_number, name: plan.part_name, revision: plan.revision },
    sheet: { number: sheet.number },
  });
}
