import type { FieldProblem } from "../core/problem";
import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import type { FlatPoint } from "../geometry/vec2";
import { holeWithin, holesMeet } from "./holeWithin";
import type { Bend, Face, FlatContour, HoleAcross, PartModel } from "./partModel";

/** A drawn hole laid into the unfolded sheet. */
export interface SheetHole {
  readonly path: string;
  readonly outline: readonly FlatPoint[];
  readonly contour: FlatContour;
  /** The face that it was drawn on; null when it was drawn on the flat. */
  readonly face: number | null;
}

/**
 * Sorts the holes to the faces that they lie in and to the bends that they reach into. One that reaches over the
 * edge of the sheet (`outline`, the flat) or meets another is a problem.
 */
export function sheetHoles(part: Pick<PartModel, "faces" | "bends">, outline: () => readonly FlatPoint[], holes: readonly SheetHole[]): {
  readonly faces: readonly Face[];
  readonly across: readonly HoleAcross[];
  readonly problems: readonly FieldProblem[];
} {
  const problems: FieldProblem[] = [];
  const inFace = new Map<number, SheetHole[]>();
  const across: HoleAcross[] = [];
  let sheet: readonly FlatPoint[] | null = null;
  const faceBoxes = part.faces.map((face) => polygonBounds(face.outline));
  const zoneBoxes = part.bends.map((bend) => polygonBounds(bend.zone));
  const boxes = holes.map((hole) => polygonBounds(hole.outline));
  holes.forEach((hole, i) => {
    const box = boxes[i];
    if (!box) return;
    const near = (other: Bounds2 | undefined) => other !== undefined && !apart(other, box);
    const home = hole.face !== null && holeWithin(hole.outline, part.faces[hole.face]?.outline ?? [])
      ? hole.face
      : part.faces.findIndex((face, k) => near(faceBoxes[k]) && holeWithin(hole.outline, face.outline) && !face.holes.some((window) => holesMeet(window, hole.outline)));
    const other = holes.findIndex((earlier, k) => k < i && near(boxes[k]) && holesMeet(earlier.outline, hole.outline));
    if (other >= 0) problems.push({ path: hole.path, message: `the hole overlaps ${holes[other]?.path ?? ""}` });
    else if (home >= 0) inFace.set(home, [...(inFace.get(home) ?? []), hole]);
    else if (!holeWithin(hole.outline, (sheet ??= outline()))) problems.push({ path: hole.path, message: "the hole reaches over the edge of the sheet; move it inwards or make it smaller" });
    else across.push({
      path: hole.path, outline: hole.outline, contour: hole.contour,
      bends: meeting(part.bends, zoneBoxes, near, (bend: Bend) => bend.zone, hole),
      faces: meeting(part.faces, faceBoxes, near, (face: Face) => face.outline, hole),
    });
  });
  const faces = part.faces.map((face, i): Face => {
    const own = inFace.get(i) ?? [];
    return { ...face, holes: [...face.holes, ...own.map((hole) => hole.outline)], holeContours: own.map((hole) => hole.contour) };
  });
  return { faces, across, problems };
}

const apart = (a: Bounds2, b: Bounds2) => a.max[0] < b.min[0] || b.max[0] < a.min[0] || a.max[1] < b.min[1] || b.max[1] < a.min[1];

function meeting<T>(all: readonly T[], boxes: readonly Bounds2[], near: (box: Bounds2 | undefined) => boolean, outlineOf: (one: T) => readonly FlatPoint[], hole: SheetHole): readonly number[] {
  return all.flatMap((one, i) => (near(boxes[i]) && holesMeet(outlineOf(one), hole.outline) ? [i] : []));
}
