import type { BendTrial, Instrument } from "@/bending/shopTable/bendTrial";
import type { InstrumentColumns, TrialRow } from "./trialRow";

const instrument = (row: InstrumentColumns): Instrument => ({ uncertainty: row.uncertainty, resolution: row.resolution });

/** The trial as the library evaluates it, in millimetres. */
export function bendTrialFromRow(row: TrialRow): BendTrial {
  return {
    id: row.id,
    units: "mm",
    material: row.material_id,
    batch: row.batch,
    nominalThickness: row.nominal_thickness_mm,
    thickness: row.thickness_mm,
    vOpening: row.v_opening_mm,
    punchRadius: row.punch_radius_mm,
    angle: row.angle_deg,
    blankLength: row.blank_mm,
    flanges: [row.flange_a_mm, row.flange_b_mm],
    insideRadius: row.inside_radius_mm,
    instruments: {
      length: instrument(row.length_instrument),
      thickness: row.thickness_instrument === null ? null : instrument(row.thickness_instrument),
      angle: instrument(row.angle_instrument),
      radius: row.radius_instrument === null ? null : instrument(row.radius_instrument),
    },
    measuredOn: row.measured_on,
    excluded: row.excluded_at === null || row.excluded_reason === null ? null
      : { reason: row.excluded_reason, by: row.excluded_by_name ?? "", on: row.excluded_at.toISOString().slice(0, 10) },
  };
}
