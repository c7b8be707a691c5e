import { mm } from "../core/units";
import type { DieOpening, OpeningBetweenTops } from "./dieOpening";

/**
 * The same die with its V taken between the tops of the shoulder arcs: each top lies rd tan((90 - die angle / 2) / 2)
 * outside the sharp corner, the tangent length of an arc that turns from the face into the top plane. Derived.
 */
export function openingBetweenTops(die: DieOpening): OpeningBetweenTops {
  if (die.measured === "between-tops") return die;
  const outside = die.shoulderRadius * Math.tan((Math.PI / 2 - die.dieAngle / 2) / 2);
  return { measured: "between-tops", opening: mm(die.opening + 2 * outside), shoulderRadius: die.shoulderRadius };
}
