import { mm, type Mm, type Rad } from "../core/units";
import { apexSetback } from "./apexSetback";
import { outsideSetback } from "./outsideSetback";

/**
 * A flange's length as a document gives it, out of its length to the apex of the outside surfaces: over 90 degrees
 * turned through, DIN 6935 measures to the outermost tangent of the outside arc, which is nearer by
 * (r + t)(tan(angle / 2) - 1); up to 90 degrees the two are one. At 180 degrees there is no apex.
 */
export function legToOutermostTangent(apexLeg: Mm, angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  return mm(apexLeg - apexSetback(angle, insideRadius, thickness) + outsideSetback(angle, insideRadius, thickness));
}
