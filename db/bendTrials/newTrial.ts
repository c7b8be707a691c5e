/** What was measured on one trial bend. Lengths in millimetres; the angle in degrees, turned through. */
export interface NewTrial {
  /** Made where the trial was typed, so that the same line sent twice is kept once. */
  readonly id: string;
  readonly material: string;
  /** "" when not known. */
  readonly batch: string;
  /** What the sheet was bought as; trials are filed under it. */
  readonly nominalThicknessMm: number;
  readonly thicknessMm: number;
  readonly vOpeningMm: number;
  readonly punchRadiusMm: number;
  readonly angleDeg: number;
  readonly blankMm: number;
  readonly flangeAMm: number;
  readonly flangeBMm: number;
  /** Null: not measured. */
  readonly insideRadiusMm: number | null;
  readonly lengthInstrumentId: string;
  /** Null: the one for lengths. */
  readonly thicknessInstrumentId: string | null;
  readonly angleInstrumentId: string;
  /** Given exactly when the inside radius is. */
  readonly radiusInstrumentId: string | null;
  /** `2026-12-01`. */
  readonly measuredOn: string;
  readonly measuredBy: string;
  readonly note: string;
  readonly partId?: string | null | undefined;
  readonly sheetId?: string | null | undefined;
}
