import { insideSetback } from "../handbook/insideSetback";
import { outsideSetback } from "../handbook/outsideSetback";
import { mm, type Mm, type Rad } from "../core/units";
import type { DimensionKind } from "./partDocument";

/** How much of a leg, measured the given way, the bend takes: from where it is measured to, to the plane part. */
export function setback(kind: DimensionKind, angle: Rad, insideRadius: Mm, thickness: Mm): Mm {
  switch (kind) {
    case "outside":
      return outsideSetback(angle, insideRadius, thickness);
    case "inside":
      return insideSetback(angle, insideRadius);
    case "tangent":
      return mm(0);
    default:
      return kind satisfies never;
  }
}
