import { mm, type Mm, type Rad } from "../core/units";

/**
 * As `outsideSetback`, for legs measured inside: up to 90 degrees to the apex of the inside surfaces,
 * r tan(angle / 2); above 90 degrees to the outermost tangent of the inside arc, r.
 */
export function insideSetback(angle: Rad, insideRadius: Mm): Mm {
  return mm(angle > Math.PI / 2 ? insideRadius : insideRadius * Math.tan(angle / 2));
}
