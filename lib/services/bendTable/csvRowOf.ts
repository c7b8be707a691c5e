import type { TrialRow } from "@/db/bendTrials/trialRow";
import type { CsvRow } from "@/lib/csv/csvColumn";
import type { bendTrialCsv } from "@/lib/schemas/bendTrialCsv";

export type TrialCsvRow = CsvRow<typeof bendTrialCsv>;

const orNull = (text: string): string | null => (text === "" ? null : text);

/** A trial as a line of a file. */
export const csvRowOf = (row: TrialRow): TrialCsvRow => ({
  number: row.number,
  material: row.material_id,
  batch: orNull(row.batch),
  nominal: row.nominal_thickness_mm,
  thickness: row.thickness_mm,
  vOpening: row.v_opening_mm,
  punchRadius: row.punch_radius_mm,
  angle: row.angle_deg,
  blank: row.blank_mm,
  flangeA: row.flange_a_mm,
  flangeB: row.flange_b_mm,
  insideRadius: row.inside_radius_mm,
  lengthInstrument: row.length_instrument.name,
  thicknessInstrument: row.thickness_instrument?.name ?? null,
  angleInstrument: row.angle_instrument.name,
  radiusInstrument: row.radius_instrument?.name ?? null,
  measuredOn: row.measured_on,
  measuredBy: row.measured_by,
  note: orNull(row.note),
});
