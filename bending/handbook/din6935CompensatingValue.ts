import { mm, type Mm, type Rad } from "../core/units";
import { din6935Factor } from "./din6935Factor";

/** Opening angle above which DIN 6935 neglects the compensating value. */
export const DIN6935_NEGLECTED_ABOVE_DEGREES = 165;

/**
 * DIN 6935 compensating value v, positive when the flat is shorter than the sum of the legs (the sign of the
 * German table book; the standard itself writes l = a + b + v). `openingAngle` is the angle left between the
 * legs, 180 degrees minus the angle turned through:
 *   up to 90:  v = 2 (r + s) - pi (180 - opening) / 180 (r + s k / 2), legs to the outermost tangents;
 *   90 to 165: v = 2 (r + s) tan((180 - opening) / 2) - the same arc, legs to the apex;
 *   over 165:  v = 0.
 */
export function din6935CompensatingValue(openingAngle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  const turned = Math.PI - openingAngle;
  if (openingAngle > (DIN6935_NEGLECTED_ABOVE_DEGREES * Math.PI) / 180 + 1e-12) return mm(0);
  const arc = turned * (insideRadius + (thickness / 2) * din6935Factor(insideRadius, thickness));
  const reach = insideRadius + thickness;
  return mm(turned > Math.PI / 2 ? 2 * reach - arc : 2 * reach * Math.tan(turned / 2) - arc);
}
