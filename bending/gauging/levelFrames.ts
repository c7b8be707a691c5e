import { invariant } from "../core/invariant";
import type { Hit } from "../clearance/hit";
import { hitLine } from "../clearance/hitLine";
import { hitSides } from "../clearance/hitSides";
import { composeFrames } from "../geometry/composeFrames";
import type { Frame } from "../geometry/frame";
import { invertFrame } from "../geometry/invertFrame";
import { foldFrames } from "../part/foldFrames";
import type { PartModel } from "../part/partModel";

/**
 * The frame of every face, from coordinates of the unfolded sheet to the machine's, while the sheet lies level on the die
 * before a stroke and is gauged: x from the bend line to the back, y up from the sheet's lower surface, z along the bed.
 */
export function levelFrames(part: PartModel, hit: Hit): readonly Frame[] {
  const first = hit.bends[0];
  invariant(first !== undefined, "a stroke forms at least one bend");
  const { bend, parentInFront, along, across, middle } = hitLine(part, hit, first, hitSides(part, hit));
  const folded = foldFrames(part, part.bends.map(({ angle }, i) => (!hit.bends.includes(i) && (hit.formed >> i) & 1 ? angle : 0)));
  const parent = folded[bend.parent];
  invariant(parent, "a bend hangs on a face");
  const side = parentInFront ? 1 : -1;
  const up = bend.direction === "up" ? 1 : -1;
  const [start] = bend.line;
  const place: Frame = {
    x: [side * across[0], 0, along[0]],
    y: [side * across[1], 0, along[1]],
    z: [0, up, 0],
    o: [-side * (start[0] * across[0] + start[1] * across[1]), up > 0 ? 0 : part.thickness, -middle],
  };
  const toMachine = composeFrames(place, invertFrame(parent));
  return folded.map((frame) => composeFrames(toMachine, frame));
}
