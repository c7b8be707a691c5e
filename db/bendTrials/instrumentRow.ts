export type InstrumentKind = "calliper" | "micrometer" | "height gauge" | "protractor" | "radius gauge";

/** Resolution and uncertainty (limit of error) in millimetres, of a protractor in degrees. */
export interface InstrumentRow {
  readonly id: string;
  readonly name: string;
  readonly kind: InstrumentKind;
  readonly resolution: number;
  readonly uncertainty: number;
  readonly note: string;
  readonly created_at: Date;
  readonly created_by_name: string | null;
  readonly withdrawn_at: Date | null;
  readonly withdrawn_by_name: string | null;
  readonly withdrawn_reason: string | null;
  /** How many trials were measured with it, withdrawn ones left out. */
  readonly trials: number;
}
