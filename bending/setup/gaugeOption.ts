import type { Interval } from "../geometry/interval";

/** One way to locate the sheet for a stroke, in the machine's frame with z from the stroke's middle, mm. */
export interface GaugeOption {
  /** Stop face of a finger at z = 0; on a slanted edge it changes by `slope` a millimetre of z. */
  readonly x: number;
  readonly slope: number;
  /** Height of the finger's rest above the die. */
  readonly r: number;
  /** An edge of a level face, or the outside of a flange that stands upright. */
  readonly on: "edge" | "face";
  /** Index of the face that is touched. */
  readonly face: number;
  /** Index of its outline's edge; of an upright face, the edge along its bend (0). */
  readonly edge: number;
  /** Where the middle of a finger may stand. */
  readonly free: readonly Interval[];
}
