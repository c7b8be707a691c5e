import type { PartModel } from "../part/partModel";
import type { Hit } from "./hit";

/** For every face, does it lie on the operator's side? Crossing a bend of the hit changes sides; `front` is in front. */
export function hitSides(part: PartModel, hit: Hit): readonly boolean[] {
  const sides: boolean[] = [false];
  part.bends.forEach((bend, i) => {
    sides[bend.child] = (sides[bend.parent] === true) !== hit.bends.includes(i);
  });
  return sides[hit.front] ? sides : sides.map((side) => !side);
}
