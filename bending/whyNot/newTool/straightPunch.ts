import { mm, type Rad } from "../../core/units";
import { straightPunchProfile } from "../../tooling/straightPunchProfile";
import type { Punch } from "../../tooling/tool";
import { newId, piecesLike } from "./asNew";

/** A straight punch of an owned one's tip radius, height, rating and tang, of a width (mm) and tip angle of its own. */
export const straightPunch = (like: Punch, width: number, tipAngle: Rad = like.tipAngle): Punch => ({
  ...like, id: newId("punch"), name: "another punch", tipAngle, pieces: piecesLike(like),
  profile: straightPunchProfile({ tipAngle, tipRadius: like.tipRadius, height: like.height, bodyWidth: mm(width) }),
});
