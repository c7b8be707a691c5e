import { mm, type Mm } from "../core/units";

/** Least distance from a bend to a hem: 5 t + the bend's radius + the hem's radius (one design guide; weak). */
export function bendToHemDistance(thickness: Mm, bendRadius: Mm, hemRadius: Mm): Mm {
  return mm(5 * thickness + bendRadius + hemRadius);
}
