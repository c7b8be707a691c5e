import { mm, type Mm, type Rad } from "../core/units";

/**
 * From the end of the bend's plane part to where the leg is measured to: up to 90 degrees turned through, the
 * apex of the outside surfaces, (r + t) tan(angle / 2); above 90 degrees, the outermost tangent of the
 * outside arc, r + t (DIN 6935). The two agree at 90 degrees.
 */
export function outsideSetback(angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  const reach = insideRadius + thickness;
  return mm(angle > Math.PI / 2 ? reach : reach * Math.tan(angle / 2));
}
