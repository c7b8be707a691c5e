import { mm, type Mm } from "../core/units";
import type { MaterialFacts } from "./material";

/** Inside radius that air bending over a V gives by itself: the material's part of the opening (see `materials.ts` for sources). */
export function naturalRadius(material: MaterialFacts, vOpening: Mm): Mm {
  return mm(material.naturalRadiusRatio * vOpening);
}
