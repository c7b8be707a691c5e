import { mm, type Rad } from "../core/units";
import type { ClearanceHit } from "./clearance";
import type { InTheWay } from "./createMoment";

const NEED = "the part comes off neither towards the operator with the ram up nor along the bed; a shorter or a relieved punch, more daylight, or a later place in the order would help";

/** That there is no way in or out, as evidence: what is in the way, on every way. */
export function trappedHits(blocking: readonly InTheWay[], angle: Rad): readonly ClearanceHit[] {
  const [first] = blocking;
  if (!first) return [];
  const { meeting: { intervals, depth }, inFront } = first;
  const [from, to] = [intervals[0]?.[0] ?? 0, intervals[intervals.length - 1]?.[1] ?? 0];
  return [{
    kind: "trapped",
    face: first.face.path.face,
    otherFace: null,
    tool: null,
    strokeAngle: angle,
    depth: mm(depth),
    z: inFront ? [-to, -from] : [from, to],
    mask: blocking.reduce((bits, { face }) => bits | face.path.mask, 0),
    value: blocking.reduce((bits, { face }) => bits | face.state, 0),
    need: NEED,
  }];
}
