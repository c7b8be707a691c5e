import type { Deg, Mm } from "../core/units";
import type { BendTrial } from "./bendTrial";
import type { TrialInMm } from "./trialInMm";

/** A trial that can be true, with the sizes that it is filed under. */
export interface FiledTrial {
  readonly trial: BendTrial;
  readonly measured: TrialInMm;
  readonly vOpening: Mm;
  readonly punchRadius: Mm;
  readonly angle: Deg;
}
