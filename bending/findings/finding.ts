import type { FlatPoint } from "../geometry/vec2";

/** How much a finding weighs: `stop` cannot be made (as drawn, or with what the shop has), `caution` risks a bad part, `note` is worth knowing. */
export type Severity = "stop" | "caution" | "note";

export type FindingRule =
  | "flange" | "narrow-v" | "hole" | "cut-out" | "radius" | "relief" | "relief-width" | "meets-itself" | "flats-overlap" | "bed" | "throat" | "blank"
  | "hem-tool" | "hem-return" | "machine-force" | "tool-force" | "mass" | "v-opening" | "angle" | "tip-radius";

/** What is wrong with a part or hard to make of it, found before anything is cut. */
export interface Finding {
  /** The same finding keeps its key while other things of the part change. */
  readonly key: string;
  readonly rule: FindingRule;
  readonly severity: Severity;
  /** Two to five words. */
  readonly title: string;
  /** What is so and what would be right, whole sentences, in the document's unit. */
  readonly message: string;
  /** Where the rule comes from, as its formula names it. */
  readonly source: string;
  readonly faces: readonly string[];
  readonly bends: readonly string[];
  /** The fields of the document that decide it, the one to change first. */
  readonly paths: readonly string[];
  readonly marks: readonly FindingMark[];
  /** What is so and what is wanted, where the rule is about one number. */
  readonly measure: FindingMeasure | null;
  /** The one change of one field that clears it, when there is one. */
  readonly cure: Cure | null;
}

/** What to draw on the unfolded sheet (mm); `region` as an outline with a pattern. */
export type FindingMark =
  | { readonly kind: "region"; readonly outline: readonly FlatPoint[] }
  | { readonly kind: "line"; readonly from: FlatPoint; readonly to: FlatPoint }
  | { readonly kind: "point"; readonly at: FlatPoint };

/** Lengths in mm, angles in degrees, forces in kN, masses in kg. */
export interface FindingMeasure {
  readonly value: number;
  readonly wanted: number;
  readonly unit: "mm" | "deg" | "kN" | "kN/m" | "kg";
}

export interface Cure {
  readonly path: string;
  /** As the document would hold it: lengths in its own units, angles in degrees. */
  readonly value: number | { readonly kind: "rectangular" };
  /** The value as a person reads it: "8.6 mm", "a rectangular relief". */
  readonly says: string;
}
