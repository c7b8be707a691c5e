import { database } from "@/db/client";
import { findMachines } from "@/db/machines/findMachines";
import type { MachineView } from "@/lib/schemas/views";

export async function listMachines(): Promise<readonly MachineView[]> {
  const rows = await findMachines(database());
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    bedLengthMm: row.bed_length_mm,
    maxForceKN: row.max_force_kn,
    daylightMm: row.daylight_mm,
    document: row.document,
  }));
}
