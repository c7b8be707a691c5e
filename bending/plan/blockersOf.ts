import type { ClearanceHit } from "../clearance/clearance";
import type { Hit } from "../clearance/hit";
import type { Die, Punch } from "../tooling/tool";
import type { Situation } from "./situation";

/** Part of the clearance that a flange may come nearer to the face that it is bent from, where both stay apart. */
const PASSING_PART = 0.5;

/**
 * What stops a stroke wherever on the bed. A flange that passes the sheet it is bent from nearer than the
 * clearance, without touching it, does so in every order: that is the part's own shape, said as a caution.
 */
export function blockersOf({ part, machine, clearance }: Situation, hit: Hit, punch: Punch, die: Die): readonly ClearanceHit[] {
  const passes = ({ kind, face, otherFace, depth }: ClearanceHit) => kind === "self" && depth < machine.settings.clearance * PASSING_PART
    && hit.bends.some((index) => {
      const bend = part.bends[index];
      return bend !== undefined && [bend.parent, bend.child].every((one) => one === face || one === otherFace);
    });
  return clearance.blocked(hit, punch, die).filter((met) => !passes(met));
}
