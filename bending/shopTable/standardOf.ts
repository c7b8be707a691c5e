import type { Instrument } from "./bendTrial";

/**
 * Standard uncertainty of one reading, in the instrument's unit: a limit of error +-a with nothing known of where within it
 * is a rectangular distribution, u = a / sqrt(3); a step of the display r is one of half-width r / 2, u = r / sqrt(12);
 * together the root of the sum of squares (JCGM 100:2008, 4.3.7, F.2.2.1 and 5.1.2).
 */
export function standardOf({ uncertainty, resolution }: Instrument): number {
  return Math.sqrt((uncertainty * uncertainty) / 3 + (resolution * resolution) / 12);
}
