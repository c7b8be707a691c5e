import type { Deg, Mm, Rad } from "../core/units";

export interface ShopQuestion {
  readonly material: string;
  readonly thickness: Mm;
  readonly vOpening: Mm;
  /** Turned through. */
  readonly angle: Rad;
  /** Absent: not known yet; then trials of every punch count whose radius follows from the V. */
  readonly punchRadius?: Mm | undefined;
}

/** A place of the table that a value stands on, with its weight in it (1 when it is the place asked for). */
export interface ShopPlace {
  readonly thickness: Mm;
  readonly vOpening: Mm;
  readonly angle: Deg;
  readonly punchRadii: readonly Mm[];
  readonly count: number;
  readonly lastMeasured: string;
  readonly weight: number;
}

export interface ShopValue {
  readonly interpolated: boolean;
  /** For the thickness and angle asked for. */
  readonly deduction: Mm;
  /** Standard and expanded (k = 2) uncertainty of the deduction, mm. */
  readonly standard: Mm;
  readonly expanded: Mm;
  /** K for `radius`; another inside radius at the same deduction has another K. */
  readonly k: number;
  readonly radius: Mm;
  /** Trials that it stands on. */
  readonly count: number;
  /** Sample standard deviation of the deduction, mm, of neighbours the larger; null when no place has two trials. */
  readonly spread: Mm | null;
  /** ISO date of the newest trial. */
  readonly lastMeasured: string;
  readonly vOpening: Mm;
  readonly places: readonly ShopPlace[];
}
