import { mm, type Mm, type Rad } from "../core/units";
import { apexSetback } from "./apexSetback";
import { outsideSetback } from "./outsideSetback";

/** The reverse of `legToOutermostTangent`: a document's flange length carried on to the apex of the outside surfaces. */
export function legToApex(documentLeg: Mm, angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  return mm(documentLeg - outsideSetback(angle, insideRadius, thickness) + apexSetback(angle, insideRadius, thickness));
}
