import { mm, rad, type Mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import type { ClearanceHit } from "./clearance";
import type { FacePath } from "./facePath";
import type { HitTable } from "./hitTable";
import type { Meeting } from "./meeting";
import { meetSelf } from "./meetSelf";
import type { Prism } from "./prism";
import { strokeSamples } from "./strokeSamples";

const kept = new WeakMap<HitTable, Map<number, Meeting>[]>();

/** Every pair of a front and a back face that meet in the stroke; kept by the state of the bends between the two. */
export function selfMeetings(part: PartModel, table: HitTable, formed: number, margin: Mm, count: () => void): readonly ClearanceHit[] {
  const { length } = table.paths;
  const known = kept.get(table) ?? Array.from({ length: length * length }, () => new Map<number, Meeting>());
  kept.set(table, known);
  const hits: ClearanceHit[] = [];
  table.paths.forEach((front, i) => table.paths.forEach((back, j) => {
    if (!front.inFront || back.inFront) return;
    const mask = front.mask | back.mask;
    const column = known[i * length + j];
    let meeting = column?.get(formed & mask);
    if (!meeting) {
      count();
      meeting = pair(part, table, front, back, formed, margin);
      column?.set(formed & mask, meeting);
    }
    const [z] = meeting.intervals;
    if (z) hits.push({ kind: "self", face: front.face, otherFace: back.face, tool: null, strokeAngle: rad(meeting.strokeAngle), depth: mm(meeting.depth), z, mask, value: formed & mask, need: null });
  }));
  return hits;
}

function pair(part: PartModel, table: HitTable, front: FacePath, back: FacePath, formed: number, margin: Mm): Meeting {
  const { bend } = table;
  const [frontPrisms, backPrisms] = [table.plates(front, formed).all, table.plates(back, formed).all];
  const speed = (prisms: readonly Prism[]) => Math.max(...prisms.map((prism) => strokeSamples(bend, part.thickness, null, prism, bend.angle, margin)));
  return meetSelf({
    bend,
    thickness: part.thickness,
    neighbours: joins(front, back) || joins(back, front),
    front: frontPrisms,
    back: backPrisms,
    finished: () => ({ front: table.plates(front, -1).all, back: table.plates(back, -1).all }),
    to: bend.angle / 2,
    steps: speed(frontPrisms) + speed(backPrisms),
    margin,
  });
}

/** Is one face bent right off the other by the stroke? */
function joins({ face, bends, line: { bend } }: FacePath, other: FacePath): boolean {
  const ends = [bend.parent, bend.child];
  return bends.length === 0 && other.bends.length === 0 && ends.includes(face) && ends.includes(other.face);
}
