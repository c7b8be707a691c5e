import type { Connection } from "../connection";
import { sheetListColumns, sheetQuery } from "./sheetQuery";
import type { SheetListRow, SheetRowState } from "./sheetRow";

/** A sheet; `snapshot` is what was frozen at its release, null while it is a draft. */
export interface SheetRow extends SheetListRow {
  readonly snapshot: unknown;
  readonly latest_revision: number;
}

export async function findSheet(db: Connection, visible: readonly SheetRowState[], id: string): Promise<SheetRow | undefined> {
  const rows: SheetRow[] = await sheetQuery(db, visible).where("sheet.id", id).select([...sheetListColumns, "sheet.snapshot", "part.latest_revision"]);
  return rows[0];
}
