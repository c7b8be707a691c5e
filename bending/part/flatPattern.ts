import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import { signedArea } from "../geometry/signedArea";
import type { FlatPoint } from "../geometry/vec2";
import { mm, type Mm, type Rad } from "../core/units";
import { contourArea } from "./contourArea";
import { contourAsChords } from "./contourAsChords";
import { flatContours } from "./flatContours";
import { flatOutline } from "./flatOutline";
import type { BendDirection } from "./partDocument";
import type { PartModel } from "./partModel";

export interface FlatBendLine {
  readonly id: string;
  readonly line: readonly [FlatPoint, FlatPoint];
  readonly angle: Rad;
  readonly direction: BendDirection;
  readonly insideRadius: Mm;
}

/** The blank that the laser or punch cuts, in the frame of the unfolded sheet (millimetres). */
export interface FlatPattern {
  /** Counter-clockwise, arcs as chords; a tear relief is a slit without width. `flatContours` has the arcs. */
  readonly outline: readonly FlatPoint[];
  /** Clockwise, arcs as chords. */
  readonly holes: readonly (readonly FlatPoint[])[];
  readonly bendLines: readonly FlatBendLine[];
  readonly bounds: Bounds2;
  /** Size along x and along y. */
  readonly width: Mm;
  readonly depth: Mm;
  /** mm², holes taken off, arcs exact. */
  readonly area: number;
  readonly massKg: number;
}

export function flatPattern(part: PartModel): FlatPattern {
  const outline = flatOutline(part);
  const contours = flatContours(part);
  const bounds = polygonBounds(outline);
  const area = contourArea(contours.outline) - contours.holes.reduce((sum, hole) => sum + Math.abs(contourArea(hole)), 0);
  return {
    outline,
    holes: contours.holes.map((hole) => clockwise(contourAsChords(hole))),
    bendLines: part.bends.map(({ id, line, angle, direction, insideRadius }) => ({ id, line, angle, direction, insideRadius })),
    bounds,
    width: mm(bounds.max[0] - bounds.min[0]),
    depth: mm(bounds.max[1] - bounds.min[1]),
    area,
    massKg: (area * part.thickness * part.material.density) / 1e9,
  };
}

const clockwise = (hole: readonly FlatPoint[]): readonly FlatPoint[] => (signedArea(hole) > 0 ? [...hole].reverse() : hole);
