import type { BendTrial } from "./bendTrial";

/** Lets an excluded trial count again. */
export function includeTrial(trial: BendTrial): BendTrial {
  return { ...trial, excluded: null };
}
