import type { MaterialRow } from "@/db/materials/materialRow";
import type { MaterialView } from "@/lib/schemas/materialViews";

export const materialView = (row: MaterialRow): MaterialView => ({
  ...row.facts,
  version: row.version,
  versionId: row.version_id,
  withdrawn: row.withdrawn_at === null ? null : { at: row.withdrawn_at.toISOString(), by: row.withdrawn_by ?? "" },
  changedAt: row.changed_at.toISOString(),
  changedBy: row.changed_by ?? "",
});
