import type { Hit } from "../clearance/hit";
import type { PartModel } from "../part/partModel";
import type { Machine } from "../tooling/machine";

/** Does the sheet go between the side frames, or stay in front of them? Level sheet behind the die is measured unfolded. */
export function passesFrames(part: PartModel, hit: Hit, behind: number, machine: Machine): boolean {
  if (behind <= machine.throatDepth) return true;
  const bend = part.bends[hit.bends[0] ?? -1];
  if (bend === undefined) return true;
  const [[ax, ay], [bx, by]] = bend.line;
  const length = Math.hypot(bx - ax, by - ay);
  const along = part.faces.flatMap(({ outline }) => outline.map((p) => (p[0] * (bx - ax) + p[1] * (by - ay)) / length));
  return Math.max(...along) - Math.min(...along) <= machine.betweenFrames;
}
