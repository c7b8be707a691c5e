import type { Hit } from "../clearance/hit";
import { hitSides } from "../clearance/hitSides";
import type { PartModel } from "../part/partModel";

/** The bends that say how the sheet behind the line looks: only they matter to the gauge. */
export function bendsBehind({ part }: { readonly part: PartModel }, hit: Hit): number {
  const front = hitSides(part, hit);
  return part.bends.reduce((mask, bend, index) => (!hit.bends.includes(index) && !front[bend.parent] && !front[bend.child] ? mask | (1 << index) : mask), 0);
}
