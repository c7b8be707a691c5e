/** A score above this marks a value that lies apart (Iglewicz & Hoaglin 1993; NIST/SEMATECH e-Handbook 1.3.5.17). */
export const OUTLIER_SCORE = 3.5;

/** Of fewer values than this nothing can be said: of two, neither is the one apart. */
export const LEAST_FOR_OUTLIERS = 3;

/** The 0.75 quantile of the standard normal distribution: MAD / 0.6745 estimates the standard deviation. */
const MAD_TO_SIGMA = 0.6745;

/**
 * Modified z-scores 0.6745 |x - median| / MAD (Iglewicz & Hoaglin, How to Detect and Handle Outliers, 1993), MAD the median of
 * the absolute deviations. A scatter smaller than `resolvable`, the standard uncertainty of the instruments, counts as that one:
 * values that agree better than can be measured make no outlier of the next (own choice). Null for fewer than three values.
 */
export function modifiedZScores(values: readonly number[], resolvable: number): readonly number[] | null {
  if (values.length < LEAST_FOR_OUTLIERS) return null;
  const middle = median(values);
  const scatter = Math.max(median(values.map((value) => Math.abs(value - middle))) / MAD_TO_SIGMA, resolvable);
  return values.map((value) => (scatter > 0 ? Math.abs(value - middle) / scatter : 0));
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const half = Math.floor(sorted.length / 2);
  const [low, high] = sorted.length % 2 === 1 ? [sorted[half], sorted[half]] : [sorted[half - 1], sorted[half]];
  return ((low ?? 0) + (high ?? 0)) / 2;
}
