import type { Mm, Rad } from "../core/units";
import type { DieOpening } from "./dieOpening";
import { openingBetweenTops } from "./openingBetweenTops";
import { penetrationDepth } from "./penetrationDepth";

/**
 * `penetrationDepth` for a die that says how its V is measured. `angle` is the angle turned through under load,
 * `insideRadius` the radius under load; travel counts from contact with the flat sheet. Derived; see there.
 */
export function punchTravel(angle: Rad, insideRadius: Mm, thickness: Mm, die: DieOpening): Mm {
  const { opening, shoulderRadius } = openingBetweenTops(die);
  return penetrationDepth(angle, insideRadius, thickness, { vOpening: opening, shoulderRadius });
}
