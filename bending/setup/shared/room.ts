import type { Interval } from "../../geometry/interval";

/**
 * The lengths that the two runs of a station may have so that it holds certain bends: of the punch, of the die, of
 * the punch less the die, and of both together at the most, mm. Both runs have one middle.
 */
export interface Room {
  readonly punch: Interval;
  readonly die: Interval;
  readonly longer: Interval;
  readonly together: number;
}

/** mm. Ends that meet within this do not overlap; the same as where one step is placed. */
export const TOUCHING_MM = 1e-6;
