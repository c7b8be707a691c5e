import { hitSides } from "../clearance/hitSides";
import { faceReach } from "../part/faceReach";
import type { Bend, PartModel } from "../part/partModel";

/** How far the sheet lies level on either side of a bend line, mm from the line. */
export interface SheetReach {
  readonly front: number;
  readonly back: number;
}

/** A face, the bends between it and the bend line, and its farthest point from the line. */
interface LevelFace { readonly mask: number; readonly far: number }

/**
 * How far the sheet lies level on either side of a bend line before the stroke, over faces that are still flat with each
 * other: what the die's shoulders have to hold. A face lies level while no bend between it and the line is formed, so
 * everything else is worked out once for a stroke.
 */
export function createSheetReach(part: PartModel, bends: readonly number[], front: number): (formed: number) => SheetReach {
  const bend = part.bends[bends[0] ?? -1];
  if (bend === undefined) return () => ({ front: 0, back: 0 });
  const levels = (start: number) => levelFaces(part, bends, start, bend);
  const parent = levels(bend.parent);
  const children = bends.map((index) => levels(part.bends[index]?.child ?? 0));
  const parentInFront = hitSides(part, { bends, front, formed: 0 })[bend.parent] === true;
  return (formed) => {
    const own = farthest(parent, formed);
    let other = Infinity;
    for (const child of children) other = Math.min(other, farthest(child, formed));
    return parentInFront ? { front: own, back: other } : { front: other, back: own };
  };
}

function farthest(faces: readonly LevelFace[], formed: number): number {
  let far = 0;
  for (const face of faces) if ((face.mask & formed) === 0 && face.far > far) far = face.far;
  return far;
}

/** The faces that hang together with one, without crossing a bend of the stroke. */
function levelFaces(part: PartModel, bends: readonly number[], start: number, bend: Bend): readonly LevelFace[] {
  const found: LevelFace[] = [];
  const seen = new Set([start]);
  const waiting = [{ face: start, mask: 0 }];
  for (let at = waiting.pop(); at !== undefined; at = waiting.pop()) {
    const { face, mask } = at;
    found.push({ mask, far: faceReach(part.faces[face]?.outline ?? [], bend) });
    part.bends.forEach(({ parent, child }, index) => {
      const next = bends.includes(index) ? null : parent === face ? child : child === face ? parent : null;
      if (next === null || seen.has(next)) return;
      seen.add(next);
      waiting.push({ face: next, mask: mask | (1 << index) });
    });
  }
  return found;
}
