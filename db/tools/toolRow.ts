/** A tool as stored, with its pieces counted. */
export interface ToolRow {
  readonly id: string;
  readonly code: string;
  readonly kind: "punch" | "die";
  readonly name: string;
  readonly profile: readonly (readonly [number, number])[];
  readonly angle_deg: number;
  readonly tip_radius_mm: number | null;
  readonly v_opening_mm: number | null;
  readonly shoulder_radius_mm: number | null;
  /** The slot of a two-stage hem die. */
  readonly flattening: { readonly floor: number; readonly back: number; readonly opening: number } | null;
  readonly height_mm: number;
  readonly max_force_kn_per_m: number;
  readonly tang: string;
  readonly updated_at: Date;
  readonly pieces: number;
  readonly pieces_in_service: number;
  readonly length_in_service_mm: number;
}
