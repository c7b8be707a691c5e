import { dotProduct } from "../../geometry/dotProduct";
import { difference } from "../../geometry/difference";
import { applyFrame } from "../../geometry/applyFrame";
import { composeFrames } from "../../geometry/composeFrames";
import { invertFrame } from "../../geometry/invertFrame";
import type { Vec3 } from "../../geometry/vec3";
import { foldFrames } from "../../part/foldFrames";
import type { PartModel } from "../../part/partModel";
import { outlineArea } from "./outlineArea";
import type { RecognisedPart } from "./recognisedPart";

export interface FoldedCheck {
  /** The farthest that a corner of a folded plate stands from the same plate's nearest edge in the solid, mm. */
  readonly farthest: number;
  /** The largest difference in area of a plate, mm²; chords for arcs are in it. */
  readonly area: number;
}

/** Folds the document's part and lays it over the solid that it was read from, plate by plate. */
export function checkFolded(part: PartModel, recognised: RecognisedPart): FoldedCheck {
  const frames = foldFrames(part, part.bends.map(({ angle }) => angle));
  const base = recognised.plates[0];
  let [farthest, area] = [0, 0];
  recognised.plates.forEach((plate, i) => {
    const folded = frames[i];
    const face = part.faces[i];
    if (!base || !folded || !face) {
      farthest = Infinity;
      return;
    }
    // The document's base lies as the plate's own coordinates do, so both end up in the solid's.
    const toSolid = composeFrames(base.frame, folded);
    const back = invertFrame(toSolid);
    const corners = face.outline.map((p) => applyFrame(toSolid, [p[0], p[1], 0]));
    for (const [x, y] of plate.outline) {
      const p = applyFrame(plate.frame, [x, y, 0]);
      farthest = Math.max(farthest, distanceToPath(p, corners), Math.abs(applyFrame(back, p)[2]));
    }
    area = Math.max(area, Math.abs(outlineArea(face.outline.map(([x, y]) => [x, y, 0])) - outlineArea(plate.outline)));
  });
  return { farthest, area };
}

function distanceToPath(p: Vec3, corners: readonly Vec3[]): number {
  return corners.reduce((least, a, i) => {
    const b = corners[(i + 1) % corners.length] ?? a;
    const [d, e] = [difference(b, a), difference(p, a)];
    const part = Math.max(0, Math.min(1, dotProduct(d, e) / Math.max(dotProduct(d, d), Number.MIN_VALUE)));
    return Math.min(least, Math.hypot(e[0] - d[0] * part, e[1] - d[1] * part, e[2] - d[2] * part));
  }, Infinity);
}
