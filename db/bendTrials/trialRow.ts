import type { InstrumentKind } from "./instrumentRow";

/** A trial as stored, with the names of what it refers to and the instruments' errors. */
export interface TrialRow {
  readonly id: string;
  readonly number: string;
  readonly material_id: string;
  readonly batch: string;
  readonly nominal_thickness_mm: number;
  readonly thickness_mm: number;
  readonly v_opening_mm: number;
  readonly punch_radius_mm: number;
  readonly angle_deg: number;
  readonly blank_mm: number;
  readonly flange_a_mm: number;
  readonly flange_b_mm: number;
  readonly inside_radius_mm: number | null;
  /** `2026-12-01`. */
  readonly measured_on: string;
  readonly measured_by: string;
  readonly note: string;
  readonly created_at: Date;
  readonly created_by_name: string | null;
  readonly part_id: string | null;
  readonly part_number: string | null;
  readonly sheet_id: string | null;
  readonly sheet_number: string | null;
  readonly excluded_at: Date | null;
  readonly excluded_by_name: string | null;
  readonly excluded_reason: string | null;
  readonly withdrawn_at: Date | null;
  readonly withdrawn_by_name: string | null;
  readonly withdrawn_reason: string | null;
  readonly length_instrument: InstrumentColumns;
  readonly thickness_instrument: InstrumentColumns | null;
  readonly angle_instrument: InstrumentColumns;
  readonly radius_instrument: InstrumentColumns | null;
}

export interface InstrumentColumns {
  readonly id: string;
  readonly name: string;
  readonly kind: InstrumentKind;
  readonly resolution: number;
  readonly uncertainty: number;
}
