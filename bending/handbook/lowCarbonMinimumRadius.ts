import { mm, type Mm } from "../core/units";

/** Smallest inside radius of low-carbon steel: half the thickness or 0.80 mm, whichever is larger (design guide). */
export function lowCarbonMinimumRadius(thickness: Mm): Mm {
  return mm(Math.max(0.5 * thickness, 0.8));
}
