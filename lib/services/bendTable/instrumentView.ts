import type { InstrumentRow } from "@/db/bendTrials/instrumentRow";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";

export const instrumentView = (row: InstrumentRow): InstrumentView => ({
  id: row.id,
  name: row.name,
  kind: row.kind,
  resolution: row.resolution,
  uncertainty: row.uncertainty,
  note: row.note,
  trials: row.trials,
  enteredBy: row.created_by_name ?? "",
  withdrawn: row.withdrawn_at === null ? null : { at: row.withdrawn_at.toISOString(), by: row.withdrawn_by_name ?? "", reason: row.withdrawn_reason ?? "" },
});
