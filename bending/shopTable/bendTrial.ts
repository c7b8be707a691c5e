import type { LengthUnit } from "../core/units";

/**
 * One trial bend as it was measured: lengths in `units`, the angle in degrees turned through (0 = flat), read after
 * springback. The V is measured between the tops of the shoulder arcs, as in a tooling document.
 */
export interface BendTrial {
  readonly id: string;
  readonly units: LengthUnit;
  /** The material's short name, e.g. `S235`. */
  readonly material: string;
  /** Of the sheet: heat, coil or delivery; "" when not known. */
  readonly batch: string;
  /** The thickness that the sheet was bought as (2 mm, 14 ga); absent: the nearest usual one, see `thicknessClass`. */
  readonly nominalThickness?: number | undefined;
  /** As measured. */
  readonly thickness: number;
  readonly vOpening: number;
  readonly punchRadius: number;
  readonly angle: number;
  /** Of the flat strip before bending, across the bend line. */
  readonly blankLength: number;
  /**
   * Outside lengths of the two legs: up to 90 degrees turned through to the apex where the outside surfaces would meet,
   * above 90 degrees to the outermost tangent (what a calliper measures over the bend), as in a part document.
   */
  readonly flanges: readonly [number, number];
  readonly insideRadius?: number | null | undefined;
  readonly instruments: TrialInstruments;
  /** ISO date, `2026-12-01`. */
  readonly measuredOn: string;
  /** Set when a person took the trial out of the values; it stays on record and in sight. */
  readonly excluded?: TrialExclusion | null | undefined;
}

export interface TrialInstruments {
  /** For flanges and blank, and for the thickness unless `thickness` is given; in the trial's length unit. */
  readonly length: Instrument;
  readonly thickness?: Instrument | null | undefined;
  /** In degrees. */
  readonly angle: Instrument;
  /** In the trial's length unit; wanted when the inside radius was measured. */
  readonly radius?: Instrument | null | undefined;
}

export interface Instrument {
  /** Limit of error: what it reads is within plus or minus this of the truth. Over 0. */
  readonly uncertainty: number;
  /** Smallest step that it shows; 0 when it is part of the limit of error. */
  readonly resolution: number;
}

export interface TrialExclusion {
  readonly reason: string;
  readonly by: string;
  /** ISO date. */
  readonly on: string;
}
