import type { Mm } from "../core/units";
import type { PartDimension } from "./partDimension";

/** How far a dimension of the folded part may miss, one part against the next. */
export interface DimensionTolerance {
  readonly dimension: PartDimension;
  readonly nominal: Mm;
  /** Plus and minus: all errors at their ends together; null when a step that it hangs on has nothing to gauge from. */
  readonly worstCase: Mm | null;
  /** Plus and minus, for about 95 of 100 parts; null as above. */
  readonly statistical: Mm | null;
  /** The steps that come in, in order. */
  readonly shares: readonly StepShare[];
}

export interface StepShare {
  /** Index of the step. */
  readonly step: number;
  /** Plus and minus that its gauge stop brings in. */
  readonly gauge: Mm;
  /** Plus and minus that its angle brings in. */
  readonly angle: Mm;
}
