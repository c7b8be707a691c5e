import { mm, rad } from "../core/units";
import type { ClearanceHit } from "./clearance";
import type { FaceState } from "./half";
import type { Meeting } from "./meeting";

/** A face's meeting with one thing as evidence; `inFront`: its half stands in front, where z runs the other way. */
export function clearanceHit(kind: ClearanceHit["kind"], tool: string | null, { path, state }: Pick<FaceState, "path" | "state">, meeting: Meeting, inFront: boolean): ClearanceHit {
  const from = meeting.intervals[0]?.[0] ?? 0;
  const to = meeting.intervals[meeting.intervals.length - 1]?.[1] ?? 0;
  return {
    kind,
    face: path.face,
    otherFace: null,
    tool,
    strokeAngle: rad(meeting.strokeAngle),
    depth: mm(meeting.depth),
    z: inFront ? [-to, -from] : [from, to],
    mask: path.mask,
    value: state,
    need: null,
  };
}
