import { mm, type Mm } from "../core/units";

/** Smallest inside radius from the reduction of area q in percent at break: R / T = 50 / q - 1, not under 0 (Kalpakjian). */
export function radiusByReduction(reductionPercent: number, thickness: Mm): Mm {
  return mm(Math.max(0, 50 / reductionPercent - 1) * thickness);
}
