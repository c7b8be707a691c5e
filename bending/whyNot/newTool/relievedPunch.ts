import { mm } from "../../core/units";
import { selfCrossing } from "../../geometry/selfCrossing";
import { relievedPunchProfile } from "../../tooling/relievedPunchProfile";
import type { Punch } from "../../tooling/tool";
import { newId, piecesLike } from "./asNew";

/** All in mm. `depth`: how far the cut-back front stands behind the tip's axis; `top`: up to where over the tip. */
export interface Relief { readonly depth: number; readonly top: number; readonly height: number; readonly width: number }

/** A relieved punch of an owned one's tip, rating and tang; null where its body leaves the relief no room. */
export function relievedPunch(like: Punch, { depth, top, height, width }: Relief): Punch | null {
  const profile = relievedPunchProfile({ tipAngle: like.tipAngle, tipRadius: like.tipRadius, height: mm(height), bodyWidth: mm(width), reliefDepth: mm(depth), reliefHeight: mm(top) });
  const bodyFrom = top + depth + width / 2;
  if (bodyFrom > height || profile.some(([, y]) => y > height + 1e-9) || selfCrossing(profile) !== null) return null;
  return { ...like, id: newId("punch"), name: "a relieved punch", height: mm(height), pieces: piecesLike(like), profile };
}
