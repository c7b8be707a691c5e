import { mm, toDeg, type Mm, type Rad } from "../core/units";

/**
 * BA = (0.01743 R + 0.0078 T) N, N degrees turned through (FAA-H-8083-31 chapter 4; AC 65-15A). One Navy
 * manual prints 0.0173 for the first constant, which is 0.75 % less.
 */
export function faaAllowance(angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  return mm((0.01743 * insideRadius + 0.0078 * thickness) * toDeg(angle));
}
