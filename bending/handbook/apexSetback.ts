import { mm, type Mm, type Rad } from "../core/units";

/**
 * Outside setback to the apex of the outside surfaces at any angle, (r + t) tan(angle / 2): how the FAA handbook and most
 * American pages measure. Over 90 degrees it parts from `outsideSetback`; at 180 degrees there is no apex.
 */
export function apexSetback(angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  return mm((insideRadius + thickness) * Math.tan(angle / 2));
}
