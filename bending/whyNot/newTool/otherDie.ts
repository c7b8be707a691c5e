import { mm, type Rad } from "../../core/units";
import type { Die } from "../../tooling/tool";
import { vDieProfile } from "../../tooling/vDieProfile";
import { newId, piecesLike } from "./asNew";

/** A die of an owned one's shoulders, height, rating and tang, of a V, angle or width of its own (mm, radians). */
export function otherDie(like: Die, { vOpening = like.vOpening, vAngle = like.vAngle, width }: { readonly vOpening?: number; readonly vAngle?: Rad; readonly width: number }): Die {
  const profile = vDieProfile({ vOpening: mm(vOpening), vAngle, shoulderRadius: like.shoulderRadius, height: like.height, bodyWidth: mm(width) });
  return { ...like, id: newId("die"), name: "another die", vOpening: mm(vOpening), vAngle, pieces: piecesLike(like), profile };
}
