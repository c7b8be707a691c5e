import type { SheetListRow } from "@/db/sheets/sheetRow";
import type { SheetListItem } from "@/lib/schemas/views";

export const sheetListItem = (row: SheetListRow): SheetListItem => ({
  id: row.id,
  number: row.number,
  state: row.state,
  partNumber: row.part_number,
  partName: row.part_name,
  revision: row.revision,
  machine: row.machine_name,
  bends: row.bends,
  batch: row.batch,
  planId: row.plan_id,
  releasedAt: row.released_at?.toISOString() ?? null,
  releasedBy: row.released_by,
  createdAt: row.created_at.toISOString(),
});
