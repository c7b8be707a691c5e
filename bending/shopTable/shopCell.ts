import type { FieldProblem } from "../core/problem";
import type { Deg, Mm } from "../core/units";
import type { TrialExclusion } from "./bendTrial";
import type { RadiusSource, Uncertain } from "./trialResult";

/** The shop's measured values. Plain data: it can be sent, stored and compared. */
export interface ShopTable {
  /** By material, thickness, V, punch radius and angle. */
  readonly cells: readonly ShopCell[];
  /** Trials that cannot be true; they are shown, and in no cell. */
  readonly refused: readonly { readonly trial: string; readonly problems: readonly FieldProblem[] }[];
}

/** Trials of one material, nominal thickness, V, punch radius and angle range. */
export interface ShopCell {
  readonly key: string;
  readonly material: string;
  /** Nominal. */
  readonly thickness: Mm;
  readonly vOpening: Mm;
  readonly punchRadius: Mm;
  /** Middle of the range. */
  readonly angle: Deg;
  /** From, to (the end left out). */
  readonly angles: readonly [Deg, Deg];
  /** The inside radius that the cell's K belongs to: the mean of what was measured on this V, else what is expected. */
  readonly radius: Mm;
  readonly radiusSource: RadiusSource;
  /** The inside radius follows from the V, not from the punch. */
  readonly followsDie: boolean;
  /** Null when every trial is excluded. */
  readonly value: CellValue | null;
  /** Excluded ones too. */
  readonly trials: readonly CellTrial[];
  /** False with fewer than three trials that count: then no outlier can be told. */
  readonly outliersTold: boolean;
}

export interface CellValue {
  /** Trials that count. */
  readonly count: number;
  /** Mean K for `radius`. */
  readonly k: number;
  /** Sample standard deviation of K; null of one trial. */
  readonly spreadK: number | null;
  /** The instruments' share of the uncertainty of one K, mean of the trials. */
  readonly instrumentsK: number;
  /** Standard uncertainty of the mean K: scatter / sqrt(count), and the instruments' share, which is common to all and is not averaged away. */
  readonly standardK: number;
  /** At the nominal thickness and the middle of the angle range. */
  readonly deduction: Uncertain;
  /** Sample standard deviation of the deduction, mm; null of one trial. */
  readonly spread: Mm | null;
  /** ISO date. */
  readonly lastMeasured: string;
}

export interface CellTrial {
  readonly id: string;
  readonly batch: string;
  readonly measuredOn: string;
  /** For the cell's radius. */
  readonly k: number;
  readonly standardK: number;
  /** The trial's own, at its own thickness and angle, mm. */
  readonly deduction: Mm;
  /** The trial's share in the cell: its K at the nominal thickness and the middle of the angle range, mm. */
  readonly deductionHere: Mm;
  /** Modified z-score; null when it does not count or none can be told. */
  readonly score: number | null;
  readonly outlier: boolean;
  readonly excluded: TrialExclusion | null;
}
