import type { Hit } from "../clearance/hit";
import { hitLine } from "../clearance/hitLine";
import { hitSides } from "../clearance/hitSides";
import type { PartModel } from "../part/partModel";

/** How far the middle of a stroke's load lies from the middle of its line along the bed, mm: the bends of a stroke load it as they are long. */
export function loadOffset(part: PartModel, hit: Hit): number {
  const first = hit.bends[0];
  if (first === undefined || hit.bends.length === 1) return 0;
  const { along, middle } = hitLine(part, hit, first, hitSides(part, hit));
  let [moment, total] = [0, 0];
  for (const index of hit.bends) {
    const bend = part.bends[index];
    if (bend === undefined) continue;
    const [[ax, ay], [bx, by]] = bend.line;
    const length = Math.hypot(bx - ax, by - ay);
    moment += length * ((along[0] * (ax + bx) + along[1] * (ay + by)) / 2 - middle);
    total += length;
  }
  return moment / total;
}
