import type { FieldProblem } from "../core/problem";
import type { Vec2 } from "../geometry/vec2";
import type { FaceWork } from "./faceWork";
import { holeAsChords } from "./holeAsChords";
import { holeWithin, holesMeet } from "./holeWithin";
import type { DocumentHole } from "./partDocument";

/**
 * A face's holes in its local coordinates (counter-clockwise), and those that do not lie wholly in its plane part.
 * `mirrored`: the holes of a flange are drawn in its own plane, whose second axis points away from the bend.
 */
export function faceHoles(face: FaceWork, holes: readonly DocumentHole[] | undefined, path: string, mirrored: boolean): {
  readonly outlines: readonly (readonly Vec2[])[];
  readonly problems: readonly FieldProblem[];
} {
  const problems: FieldProblem[] = [];
  const outlines = (holes ?? []).map((hole) => {
    const points = holeAsChords(hole);
    return mirrored ? points.map(([a, b]): Vec2 => [a, -b]).reverse() : points;
  });
  outlines.forEach((hole, i) => {
    if (!holeWithin(hole, face.plane)) {
      problems.push({ path: `${path}[${i}]`, message: `the hole reaches over the plane part of "${face.id}" (its outline less what the bends take); move it inwards or make it smaller` });
      return;
    }
    const other = outlines.slice(0, i).findIndex((earlier) => holesMeet(earlier, hole));
    if (other >= 0) problems.push({ path: `${path}[${i}]`, message: `the hole overlaps ${path}[${other}]` });
  });
  return { outlines, problems };
}
