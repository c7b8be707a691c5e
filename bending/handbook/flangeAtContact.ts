import type { Mm, Rad } from "../core/units";
import type { DieOpening } from "./dieOpening";
import { minimumFlange } from "./minimumFlange";
import { openingBetweenTops } from "./openingBetweenTops";

/**
 * `minimumFlange` for a die that says how its V is measured: the shortest outside flange, to the apex of the outside
 * surfaces, that still touches the shoulder at the end of the air bend. No margin; derived from the two tangencies.
 */
export function flangeAtContact(angle: Rad, die: DieOpening): Mm {
  const { opening, shoulderRadius } = openingBetweenTops(die);
  return minimumFlange(angle, { vOpening: opening, shoulderRadius });
}
