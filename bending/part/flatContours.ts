import { arcsFromChords } from "./arcsFromChords";
import { contourArea } from "./contourArea";
import { flatOutline } from "./flatOutline";
import type { FlatContour, PartModel } from "./partModel";
import { reversedPath } from "./reversedPath";

/** What is cut, exact to the arc, in the frame of the unfolded sheet (mm). */
export interface FlatContours {
  /** A closed path, counter-clockwise. */
  readonly outline: FlatContour & { readonly kind: "path" };
  /** Circles, and paths that run clockwise: those in faces, those across bends, those that part faces. */
  readonly holes: readonly FlatContour[];
}

/** The contours of the flat with arcs as arcs, for drawings and for cutting. */
export function flatContours(part: PartModel): FlatContours {
  const drawn = part.drawnFlat?.outline;
  const outline = drawn?.kind === "path" ? drawn : { kind: "path" as const, vertices: arcsFromChords(flatOutline(part), part.circles) };
  const holes = [...part.faces.flatMap((face) => face.holeContours), ...part.holesAcross.map(({ contour }) => contour), ...(part.drawnFlat?.holes ?? [])];
  return { outline, holes: holes.map(clockwise) };
}

function clockwise(contour: FlatContour): FlatContour {
  return contour.kind === "path" && contourArea(contour) > 0 ? { ...contour, vertices: reversedPath(contour.vertices) } : contour;
}
