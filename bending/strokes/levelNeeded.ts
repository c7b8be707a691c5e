import { mm, type Mm } from "../core/units";
import { apexSetback } from "../handbook/apexSetback";
import { minimumFlange } from "../handbook/minimumFlange";
import type { Bend } from "../part/partModel";
import type { Die } from "../tooling/tool";

/** mm from the bend line. Level sheet that a die needs on either side of it: half the V at the start, and up to the shoulder's contact at the end of the stroke. */
export function levelNeeded(bend: Pick<Bend, "angle" | "insideRadius" | "allowance">, thickness: Mm, die: Die): Mm {
  const held = minimumFlange(bend.angle, die) - apexSetback(bend.angle, bend.insideRadius, thickness) + bend.allowance / 2;
  return mm(Math.max(die.vOpening / 2, held));
}
