import { mm, rad, type Mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import type { ClearanceHit } from "./clearance";
import type { FacePath } from "./facePath";
import type { HitTable } from "./hitTable";
import type { Meeting } from "./meeting";
import { meetSelf } from "./meetSelf";
import type { Prism } from "./prism";
import { strokeSamples } from "./strokeSamples";

const kept = new WeakMap<HitTable, Map<string, Meeting>>();

/** Every pair of a front and a back face that meet in the stroke; kept by the state of the bends between the two. */
export function selfMeetings(part: PartModel, table: HitTable, formed: number, margin: Mm, count: () => void): readonly ClearanceHit[] {
  const known = kept.get(table) ?? new Map<string, Meeting>();
  kept.set(table, known);
  const hits: ClearanceHit[] = [];
  table.paths.forEach((front, i) => table.paths.forEach((back, j) => {
    if (!front.inFront || back.inFront) return;
    const mask = front.mask | back.mask;
    const key = `${i},${j},${formed & mask}`;
    let meeting = known.get(key);
    if (!meeting) {
      count();
      meeting = pair(part, table, front, back, formed, margin);
      known.set(key, meeting);
    }
    const [z] = meeting.intervals;
    if (z) hits.push({ kind: "self", face: front.face, otherFace: back.face, tool: null, strokeAngle: rad(meeting.strokeAngle), depth: mm(meeting.depth), z, mask, value: formed & mask, need: null });
  }));
  return hits;
}

function pair(part: PartModel, table: HitTable, front: FacePath, back: FacePath, formed: number, margin: Mm): Meeting {
  const { bend } = table;
  const [frontPrisms, backPrisms] = [table.prisms(front, formed), table.prisms(back, formed)];
  const speed = (prisms: readonly Prism[]) => Math.max(...prisms.map((prism) => strokeSamples(bend, part.thickness, null, prism, bend.angle, margin)));
  return meetSelf({
    bend,
    thickness: part.thickness,
    front: frontPrisms,
    back: backPrisms,
    finishedFront: table.prisms(front, -1),
    finishedBack: table.prisms(back, -1),
    to: bend.angle / 2,
    steps: speed(frontPrisms) + speed(backPrisms),
    margin,
  });
}
