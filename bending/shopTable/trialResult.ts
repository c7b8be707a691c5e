import type { Deg, Mm } from "../core/units";

/** A measured quantity with what the instruments leave open. */
export interface Uncertain {
  readonly value: number;
  /** Standard uncertainty (one standard deviation). */
  readonly standard: number;
  /** Expanded uncertainty, coverage factor k = 2: about 95 % (JCGM 100:2008, 6.2 and 6.3). */
  readonly expanded: number;
}

export type RadiusSource = "measured" | "natural radius of the V" | "punch radius";

/** What one trial says; lengths in mm. */
export interface TrialResult {
  /** Sum of the legs less the blank. */
  readonly deduction: Uncertain;
  readonly allowance: Uncertain;
  /** Belongs to `insideRadius`: together they give the measured deduction back. */
  readonly k: Uncertain;
  readonly insideRadius: { readonly value: Mm; readonly source: RadiusSource };
  /** The nominal thickness that the trial is filed under. */
  readonly thicknessClass: Mm;
  /** Middle of the angle range that the trial is filed under. */
  readonly angleClass: Deg;
  readonly budget: readonly BudgetLine[];
}

export type MeasuredField = "flanges[0]" | "flanges[1]" | "blankLength" | "thickness" | "angle" | "insideRadius";

/** One input's share: its standard uncertainty (mm, of the angle radians) and what one unit of it does to each result. */
export interface BudgetLine {
  readonly of: MeasuredField;
  readonly standard: number;
  readonly onDeduction: number;
  readonly onAllowance: number;
  readonly onK: number;
}
