import { mm, type Mm } from "../core/units";

/** Inside radius under which an air bend turns sharp: the punch creases the sheet. About 63 % of the thickness, carbon steel (The FABRICATOR). */
export function sharpBendLimit(thickness: Mm): Mm {
  return mm(0.63 * thickness);
}
