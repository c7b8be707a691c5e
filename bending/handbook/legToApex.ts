import { mm, type Mm, type Rad } from "../core/units";
import { outsideSetback } from "./outsideSetback";

/** The reverse of `legToOutermostTangent`: a document's flange length carried on to the apex of the outside surfaces. */
export function legToApex(documentLeg: Mm, angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  const apexSetback = (insideRadius + thickness) * Math.tan(angle / 2);
  return mm(documentLeg - outsideSetback(angle, insideRadius, thickness) + apexSetback);
}
