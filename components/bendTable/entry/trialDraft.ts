import type { LengthUnit } from "@/bending/core/units";

/** The fields of a line in the order in which they stand, as typed. */
export const lineFields = ["material", "batch", "nominal", "thickness", "vOpening", "punchRadius", "angle", "blank", "flangeA", "flangeB", "insideRadius", "note"] as const;
export type LineField = (typeof lineFields)[number];

/** One trial as typed; the id is made here, so that a line that is sent twice is kept once. */
export type TrialLine = Readonly<Record<LineField, string>> & { readonly id: string };

/** Whether angles are typed as turned through (0 is flat) or as what is left between the flanges (180 is flat). */
export type AngleKind = "turned" | "included";

/** A page of the notebook: what holds for all lines, and the lines. */
export interface TrialDraft {
  readonly units: LengthUnit;
  readonly angles: AngleKind;
  readonly measuredOn: string;
  readonly measuredBy: string;
  /** Ids of instruments; "" until one is chosen. */
  readonly lengthInstrument: string;
  /** "": the one for lengths. */
  readonly thicknessInstrument: string;
  readonly angleInstrument: string;
  readonly radiusInstrument: string;
  readonly lines: readonly TrialLine[];
}
