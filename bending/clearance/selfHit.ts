import { mm, rad } from "../core/units";
import type { ClearanceHit } from "./clearance";
import type { SelfMeeting } from "./createSelf";

/** The part meeting itself as evidence: `oneInFront` tells which of the two faces stands in front. */
export function selfHit({ one, other, meeting }: SelfMeeting, oneInFront: boolean): ClearanceHit {
  const [front, back] = oneInFront ? [one, other] : [other, one];
  const [from, to] = meeting.intervals[0] ?? [0, 0];
  return {
    kind: "self",
    face: front.path.face,
    otherFace: back.path.face,
    tool: null,
    strokeAngle: rad(meeting.strokeAngle),
    depth: mm(meeting.depth),
    z: oneInFront ? [-to, -from] : [from, to],
    mask: one.path.mask | other.path.mask,
    value: one.state | other.state,
    need: null,
  };
}
