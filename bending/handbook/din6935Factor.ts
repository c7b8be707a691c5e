import type { Mm } from "../core/units";

/** Below this r/s the logarithm runs to nothing; held there, common practice, no source. */
const LEAST_RATIO = 0.1;

/**
 * DIN 6935 factor k = 0.65 + 0.5 log10(r / s), 1 above r / s = 5 (English summary of DIN 6935 and a German
 * metal-trades table book). The neutral line lies at k / 2 of the thickness: K = k / 2.
 */
export function din6935Factor(insideRadius: Mm, thickness: Mm): number {
  const ratio = insideRadius / thickness;
  if (ratio > 5) return 1;
  return 0.65 + 0.5 * Math.log10(Math.max(ratio, LEAST_RATIO));
}
