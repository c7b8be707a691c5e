import type { Connection } from "../connection";
import type { NewTrial } from "./newTrial";

/** Puts in trials; one whose id is there already is left as it is. Answers the ids that are new. */
export async function insertTrials(db: Connection, trials: readonly NewTrial[], by: string | null): Promise<readonly string[]> {
  if (trials.length === 0) return [];
  const rows = await db("bend_trials")
    .insert(trials.map((trial) => ({
      id: trial.id,
      material_id: trial.material,
      batch: trial.batch,
      nominal_thickness_mm: trial.nominalThicknessMm,
      thickness_mm: trial.thicknessMm,
      v_opening_mm: trial.vOpeningMm,
      punch_radius_mm: trial.punchRadiusMm,
      angle_deg: trial.angleDeg,
      blank_mm: trial.blankMm,
      flange_a_mm: trial.flangeAMm,
      flange_b_mm: trial.flangeBMm,
      inside_radius_mm: trial.insideRadiusMm,
      length_instrument_id: trial.lengthInstrumentId,
      thickness_instrument_id: trial.thicknessInstrumentId,
      angle_instrument_id: trial.angleInstrumentId,
      radius_instrument_id: trial.radiusInstrumentId,
      measured_on: trial.measuredOn,
      measured_by: trial.measuredBy,
      note: trial.note,
      part_id: trial.partId ?? null,
      sheet_id: trial.sheetId ?? null,
      created_by: by,
    })))
    .onConflict("id")
    .ignore()
    .returning<{ id: string }[]>("id");
  return rows.map((row) => row.id);
}
