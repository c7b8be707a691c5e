import { ARC_CHORD_MM } from "../core/tolerance";
import { circleToChords } from "../geometry/circleToChords";
import type { FlatPoint } from "../geometry/vec2";
import { outlineAsChords } from "./outlineAsChords";
import type { FlatContour } from "./partModel";

/** A contour as a polygon, run the way the contour runs (a circle counter-clockwise). */
export function contourAsChords(contour: FlatContour): readonly FlatPoint[] {
  return contour.kind === "circle" ? circleToChords(contour.centre, contour.radius, ARC_CHORD_MM) : outlineAsChords(contour.vertices).points;
}
