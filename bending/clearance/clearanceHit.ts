import { mm, rad } from "../core/units";
import type { ClearanceHit } from "./clearance";
import type { FaceMeeting } from "./hitTable";

/** A meeting with one thing as evidence. */
export function clearanceHit(kind: ClearanceHit["kind"], tool: string | null, { path, state, meeting }: FaceMeeting): ClearanceHit {
  const from = meeting.intervals[0]?.[0] ?? 0;
  const to = meeting.intervals[meeting.intervals.length - 1]?.[1] ?? 0;
  return {
    kind,
    face: path.face,
    otherFace: null,
    tool,
    strokeAngle: rad(meeting.strokeAngle),
    depth: mm(meeting.depth),
    z: [from, to],
    mask: path.mask,
    value: state,
    need: null,
  };
}
