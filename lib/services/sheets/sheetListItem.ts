import type { SheetListRow } from "@/db/sheets/sheetRow";
import type { FlatChange, SheetListItem } from "@/lib/schemas/views";

/** `change` is that of its flat, when it would come out differently now. */
export const sheetListItem = (row: SheetListRow, change: FlatChange | undefined): SheetListItem => ({
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
  flatChange: change ?? null,
  createdAt: row.created_at.toISOString(),
});
