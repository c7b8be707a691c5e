import type { Vec2 } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import type { PartModel } from "../part/partModel";
import { readHitId } from "../strokes/hitId";

/** A bend at the border of a face, seen from the face. */
export interface FaceEnd {
  readonly bend: number;
  /** Unit vector in the sheet, out of the face. */
  readonly out: Vec2;
  /** Its tangent on the face: how far out, and from where to where along it. */
  readonly at: number;
  readonly span: readonly [number, number];
}

/** The bends round a face, its own first; one of a row that rolls a large radius has no outside of its own and is left out. */
export function faceEnds(part: PartModel, face: number): readonly FaceEnd[] {
  return part.bends.flatMap((bend, index): readonly FaceEnd[] => {
    if ((bend.parent !== face && bend.child !== face) || readHitId(bend.id) !== null) return [];
    const { outward } = bendDirections(bend);
    const out: Vec2 = bend.parent === face ? outward : [-outward[0], -outward[1]];
    const [p, q] = bend.parent === face ? [bend.zone[0], bend.zone[3]] : [bend.zone[1], bend.zone[2]];
    const along = [p, q].map((point) => point[1] * out[0] - point[0] * out[1]);
    return [{ bend: index, out, at: p[0] * out[0] + p[1] * out[1], span: [Math.min(...along), Math.max(...along)] }];
  }).sort((a, b) => Number(part.bends[b.bend]?.child === face) - Number(part.bends[a.bend]?.child === face) || a.bend - b.bend);
}
