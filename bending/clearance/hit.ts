/** One stroke on one bend line: what stands where. */
export interface Hit {
  /** Bend indices that this stroke forms; more than one when their lines fall into one line. */
  readonly bends: readonly number[];
  /** Index of a face next to the bend line: its side of the part is on the operator's side. */
  readonly front: number;
  /** Bit mask over bend indices: those formed before this step (at most 30 bends). */
  readonly formed: number;
}
