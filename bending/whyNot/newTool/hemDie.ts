import { deg, kiloNewtonPerMetre, mm, toRad } from "../../core/units";
import { hemDieProfile } from "../../tooling/hemDieProfile";
import type { Die } from "../../tooling/tool";
import { newId, piecesLike } from "./asNew";

/** Degrees. V of a two-stage hem die and tip of its punch: common practice, no source. */
export const HEM_ANGLE_DEG = 26;
/** mm. Die above the slot, under the V's root; die below the slot; slot behind the V's middle; all common practice, no source. */
const [OVER_SLOT, UNDER_SLOT, BEHIND] = [7, 30, 6];

/** All in mm; `depth`: from the front of the die to the end of the slot; `rating` in kN/m. */
export interface HemDieShape { readonly vOpening: number; readonly opening: number; readonly depth: number; readonly rating: number }

/** A two-stage hem die of an owned die's tang, shoulders and lengths of pieces. */
export function hemDie(like: Die, { vOpening, opening, depth, rating }: HemDieShape): Die {
  const vAngle = toRad(deg(HEM_ANGLE_DEG));
  const floor = opening + OVER_SLOT + vOpening / 2 / Math.tan(vAngle / 2);
  const height = Math.max(like.height, Math.ceil(floor + UNDER_SLOT));
  const shape = { vOpening: mm(vOpening), vAngle, shoulderRadius: like.shoulderRadius, height: mm(height), bodyWidth: mm(2 * (depth - BEHIND)) };
  const flattening = { floor: mm(floor), back: mm(BEHIND), opening: mm(opening) };
  return {
    ...like, id: newId("die"), name: "a two-stage hem die", vOpening: mm(vOpening), vAngle, height: mm(height), maxForcePerMetre: kiloNewtonPerMetre(rating),
    pieces: piecesLike(like), profile: hemDieProfile(shape, flattening), flattening,
  };
}
