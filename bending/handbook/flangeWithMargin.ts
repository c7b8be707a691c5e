import { mm, rad, type Mm, type Rad } from "../core/units";
import type { DieOpening } from "./dieOpening";
import { flangeAtContact } from "./flangeAtContact";
import { advisedFlange } from "./minimumFlange";
import { openingBetweenTops } from "./openingBetweenTops";

export interface FlangeNeed {
  /** Touches the shoulder with nothing to spare, to the outside apex. */
  readonly contact: Mm;
  /** What the trade chart adds at 90 degrees in this V, not under 0. */
  readonly margin: Mm;
  readonly advised: Mm;
  /** Flat sheet needed on each side of the bend line before the stroke: half the opening between the arc tops. */
  readonly halfBlank: Mm;
}

/**
 * Shortest flange with the margin of the trade chart (0.70 V to 0.77 V, mild steel, 88 degree dies). The chart speaks of
 * 90 degrees; carrying its margin over to other angles is common practice, no source.
 */
export function flangeWithMargin(angle: Rad, die: DieOpening): FlangeNeed {
  const contact = flangeAtContact(angle, die);
  const margin = mm(Math.max(0, advisedFlange(die.opening) - flangeAtContact(rad(Math.PI / 2), die)));
  return { contact, margin, advised: mm(contact + margin), halfBlank: mm(openingBetweenTops(die).opening / 2) };
}
