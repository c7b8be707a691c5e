import type { PlanListRow } from "@/db/plans/planRow";
import type { PlanListItem } from "@/lib/schemas/views";

export const planListItem = (row: PlanListRow): PlanListItem => ({
  id: row.id,
  partId: row.part_id,
  partNumber: row.part_number,
  partName: row.part_name,
  revision: row.revision,
  machine: row.machine_name,
  status: row.status,
  batch: row.batch,
  steps: row.steps,
  stations: row.stations,
  secondsPerPart: row.seconds_per_part,
  setupSeconds: row.setup_seconds,
  origin: row.origin,
  createdAt: row.created_at.toISOString(),
  createdBy: row.created_by ?? "",
});
