import type { PartModel } from "../part/partModel";
import { faceEnds } from "./faceEnds";
import type { PartDimension } from "./partDimension";

/** From the outside of every bend to the nearest round hole of each face beside it; other holes of the face miss by the same. */
export function holeDimensions(part: PartModel): readonly PartDimension[] {
  return part.faces.flatMap((face, index) => {
    const round = face.holeContours.flatMap((contour) => (contour.kind === "circle" ? [contour.centre] : []));
    if (round.length === 0) return [];
    return faceEnds(part, index).flatMap(({ bend, out }): readonly PartDimension[] => {
      const [first, ...rest] = round;
      if (!first) return [];
      const depth = (p: readonly [number, number]) => p[0] * out[0] + p[1] * out[1];
      const nearest = rest.reduce((best, p) => (depth(p) > depth(best) + 1e-6 ? p : best), first);
      return [{
        kind: "hole", face: index, direction: [-out[0], -out[1], 0],
        from: [{ at: "outside", face: index, bend }],
        to: [{ at: "point", face: index, point: [nearest[0], nearest[1], 0], name: "hole" }],
      }];
    });
  });
}
