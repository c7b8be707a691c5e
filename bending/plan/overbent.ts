import type { Rad } from "../core/units";
import { springback } from "../handbook/springback";
import type { Bend, PartModel } from "../part/partModel";

const known = new WeakMap<Bend, Rad>();

/** Radians turned through that the stroke of a bend goes to, so that it springs back to its own angle; worked out once for each bend. */
export function overbent(part: PartModel, bend: Bend): Rad {
  const found = known.get(bend) ?? springback(bend.angle, bend.insideRadius, part.thickness, part.material).angle;
  known.set(bend, found);
  return found;
}
