import type { Hit } from "../clearance/hit";
import { bendDirections } from "../part/bendDirections";
import type { PartModel } from "../part/partModel";

/** Does the child of this bend lie the other way in the sheet than the child of the stroke's first bend? */
export function opposedBend(part: PartModel, step: Pick<Hit, "bends">, index: number): boolean {
  const [first, bend] = [part.bends[step.bends[0] ?? -1], part.bends[index]];
  if (!first || !bend) return false;
  const [a, b] = [bendDirections(first).outward, bendDirections(bend).outward];
  return a[0] * b[0] + a[1] * b[1] < 0;
}
