import type { RadiusSource, TrialResult } from "@/bending/shopTable/trialResult";
import type { InstrumentKind, TrialState, ValueState } from "./bendTableInputs";

/** What the API answers about the bend table: lengths in mm, angles in degrees turned through, times as ISO 8601. */

export interface Judged {
  readonly reason: string;
  readonly by: string;
  readonly at: string;
}

export interface InstrumentView {
  readonly id: string;
  readonly name: string;
  readonly kind: InstrumentKind;
  /** In millimetres, of a protractor in degrees; so is the uncertainty. */
  readonly resolution: number;
  /** Limit of error. */
  readonly uncertainty: number;
  readonly note: string;
  /** How many trials were measured with it. */
  readonly trials: number;
  readonly enteredBy: string;
  readonly withdrawn: Judged | null;
}

export interface TrialView {
  readonly id: string;
  readonly number: string;
  readonly state: TrialState;
  readonly material: string;
  readonly batch: string;
  readonly nominalMm: number;
  readonly thicknessMm: number;
  readonly vOpeningMm: number;
  readonly punchRadiusMm: number;
  readonly angleDeg: number;
  readonly blankMm: number;
  readonly flangesMm: readonly [number, number];
  readonly insideRadiusMm: number | null;
  /** Names of the instruments. */
  readonly measuredWith: readonly string[];
  /** `2026-12-01`. */
  readonly measuredOn: string;
  readonly measuredBy: string;
  readonly note: string;
  readonly part: { readonly id: string; readonly number: string } | null;
  readonly sheet: { readonly id: string; readonly number: string } | null;
  readonly enteredAt: string;
  readonly enteredBy: string;
  readonly excluded: Judged | null;
  readonly withdrawn: Judged | null;
  /** What comes of it; null when it cannot be evaluated, and then why. */
  readonly result: TrialResult | null;
  readonly problem: string | null;
  /** The address of the value that it counts in: `/bend-table/values/{key}`. */
  readonly valueKey: string | null;
}

/** Trials of one material, nominal thickness, V, punch radius and angle range, and what they come to. */
export interface ValueItem {
  readonly key: string;
  readonly material: string;
  readonly thicknessMm: number;
  readonly vOpeningMm: number;
  readonly punchRadiusMm: number;
  /** Middle of the angle range. */
  readonly angleDeg: number;
  readonly anglesDeg: readonly [number, number];
  /** The inside radius that K belongs to. */
  readonly radiusMm: number;
  readonly radiusSource: RadiusSource;
  readonly state: ValueState;
  /** How many trials count, how many were left out by a person, how many of those that count lie apart. */
  readonly counted: number;
  readonly excluded: number;
  readonly outliers: number;
  /** Null when none counts; so are the next three. The spread is null of one trial as well. */
  readonly deductionMm: number | null;
  /** Of the mean deduction, with coverage factor 2 (about 95 %). */
  readonly expandedMm: number | null;
  readonly k: number | null;
  readonly spreadMm: number | null;
  readonly lastMeasured: string | null;
  /** The handbook's deduction for the same bend. */
  readonly handbookMm: number | null;
}

export interface ValueTrial extends TrialView {
  /** What the trial says of the value's own thickness and angle. */
  readonly deductionHereMm: number;
  readonly kHere: number;
  /** How far it lies apart, as a modified z-score; null when it does not count or none can be told. */
  readonly score: number | null;
  readonly outlier: boolean;
}

export interface ValueDetail extends ValueItem {
  readonly materialName: string;
  readonly spreadK: number | null;
  /** False with fewer than three trials that count. */
  readonly outliersTold: boolean;
  readonly handbook: { readonly radiusMm: number; readonly deductionMm: number; readonly k: number; readonly source: string };
  readonly trials: readonly ValueTrial[];
  /** The newest plan whose flat stands on this value. */
  readonly lastUsed: { readonly at: string; readonly partId: string; readonly partNumber: string } | null;
  /** Parts of this material and thickness. */
  readonly parts: readonly { readonly id: string; readonly number: string; readonly name: string; readonly bends: number }[];
}

export interface AddedTrials {
  readonly trials: readonly TrialView[];
  /** How many of them were there already: the same lines sent twice. */
  readonly known: number;
}

/** `measured`: trials of just this sheet and V. `between`: taken between measured neighbours. `open`: nothing near enough. `unusual`: nobody bends this sheet in this V. */
export type CoverageKind = "measured" | "between" | "open" | "unusual";

export interface CoverageCell {
  readonly vOpeningMm: number;
  readonly kind: CoverageKind;
  /** At 90 degrees; null when it is open or unusual, or measured at other angles alone. */
  readonly deductionMm: number | null;
  readonly expandedMm: number | null;
  /** Trials that count, at any angle. */
  readonly trials: number;
  /** Middles of the angle ranges that were measured. */
  readonly anglesDeg: readonly number[];
  /** The values of this place; the first is the one nearest to 90 degrees. */
  readonly valueKeys: readonly string[];
  /** A trial of this place lies apart. */
  readonly outlier: boolean;
  /** The V nearest to the rule for this thickness, of those that the shop has. */
  readonly byRule: boolean;
}

export interface CoverageRow {
  readonly thicknessMm: number;
  /** Bends of the shop's parts in this sheet. */
  readonly bends: number;
  readonly parts: number;
  readonly cells: readonly CoverageCell[];
}

/** A trial worth bending next, with the strip to cut for it. */
export interface SuggestedTrial {
  readonly thicknessMm: number;
  readonly vOpeningMm: number;
  readonly why: string;
  readonly angleDeg: number;
  readonly pieces: number;
  readonly blankMm: number;
  readonly widthMm: number;
  /** What each flange comes to when the strip is bent in its middle, by the handbook. */
  readonly flangeMm: number;
  /** Shortest flange that the V takes. */
  readonly leastFlangeMm: number;
}

export interface CoverageView {
  readonly material: string;
  readonly materialName: string;
  /** V openings: those of dies in service, and those of trials. */
  readonly openings: readonly { readonly vOpeningMm: number; readonly inService: boolean }[];
  readonly rows: readonly CoverageRow[];
  readonly suggestions: readonly SuggestedTrial[];
}
