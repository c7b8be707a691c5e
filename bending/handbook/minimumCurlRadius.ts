import { mm, type Mm } from "../core/units";

/** Least radius of a curled edge: 2 T (stamping design guides). */
export function minimumCurlRadius(thickness: Mm): Mm {
  return mm(2 * thickness);
}
