import type { Mm, Rad } from "../core/units";
import type { FlatPoint } from "../geometry/vec2";
import type { AllowanceBasis } from "../handbook/allowanceBasis";
import type { MaterialFacts } from "../handbook/material";
import type { BendDirection, HemKind } from "./partDocument";

export type FaceId = string;
export type BendId = string;

/**
 * A part made ready for computing: a tree of plane faces joined by bends, all in millimetres and radians,
 * drawn unfolded. Face 0 is the base; a parent stands before its children, and `bends[i]` carries
 * `faces[i + 1]`, so that bends and faces but the base have the same order.
 *
 * Frame of the unfolded sheet: x, y in the sheet seen from the base's top; z = 0 at the bottom surface,
 * z = thickness at the top.
 */
export interface PartModel {
  readonly name: string;
  readonly thickness: Mm;
  readonly material: MaterialFacts;
  /** Plus and minus on lengths that have no tolerance of their own; null when the general tolerance holds. */
  readonly toleranceLength: Mm | null;
  readonly faces: readonly Face[];
  readonly bends: readonly Bend[];
  /** Holes that reach into bends; they belong to no face's `holes`. */
  readonly holesAcross: readonly HoleAcross[];
  /** Circles whose arcs run along the outlines, to give arcs back for chords. */
  readonly circles: readonly FlatCircle[];
  /** The contours as they were drawn, when the part was drawn as a flat. */
  readonly drawnFlat: DrawnFlat | null;
}

/** What is read out of a document's shape. */
export type PartShape = Omit<PartModel, "name" | "thickness" | "material" | "toleranceLength">;

/** A hole over one or more bend zones: its shape holds in the flat, the folded one follows by bending it. */
export interface HoleAcross {
  /** Where it stands in the document, e.g. `base.holes[0]`. */
  readonly path: string;
  /** In the unfolded sheet, counter-clockwise, arcs as chords. */
  readonly outline: readonly FlatPoint[];
  readonly contour: FlatContour;
  /** Indices of the bends whose zones it reaches into. */
  readonly bends: readonly number[];
  /** Indices of the faces whose plane part it reaches into. */
  readonly faces: readonly number[];
}

export interface FlatCircle {
  readonly centre: FlatPoint;
  readonly radius: number;
}

export interface DrawnFlat {
  readonly outline: FlatContour;
  /** Holes that part faces from one another (a tab cut free within the sheet). */
  readonly holes: readonly FlatContour[];
}

/** [x, y, bulge of the edge that starts here]; a bulge of 0 is a straight edge. */
export type BulgeVertex = readonly [number, number, number];

/** A closed contour of the flat, exact: arcs are arcs. */
export type FlatContour =
  | { readonly kind: "circle"; readonly centre: FlatPoint; readonly radius: number }
  | { readonly kind: "path"; readonly vertices: readonly BulgeVertex[] };

/** A piece of sheet with holes in it; arcs as chords, outline counter-clockwise. */
export interface FlatRegion {
  readonly outline: readonly FlatPoint[];
  readonly holes: readonly (readonly FlatPoint[])[];
}

export interface Face {
  readonly id: FaceId;
  /** The plane region only, without any bend zone; counter-clockwise; arcs already as chords. */
  readonly outline: readonly FlatPoint[];
  /** Clockwise or counter-clockwise, arcs as chords; the window in which a tab of the same sheet stands is one too. */
  readonly holes: readonly (readonly FlatPoint[])[];
  /** The drawn holes that lie in the face, exact. */
  readonly holeContours: readonly FlatContour[];
  /** Index of the bend that carries this face; null for the base. */
  readonly bend: number | null;
}

/**
 * A bend line between `parent` (nearer the base) and `child`. The line runs along the parent's edge in the
 * parent's counter-clockwise sense, so the parent lies on its left and the child on its right.
 */
export interface Bend {
  readonly id: BendId;
  readonly parent: number;
  readonly child: number;
  /** Angle turned through when finished, 0 < angle <= pi; the loop of a teardrop hem turns up to 3/2 pi. */
  readonly angle: Rad;
  /** `up`: the child turns towards the side that is the base's top. */
  readonly direction: BendDirection;
  readonly hem: HemKind | null;
  /** Inside radius when finished. */
  readonly insideRadius: Mm;
  /** Where the radius comes from: the document, the die, or the material's default. */
  readonly radiusSource: string;
  /** Neutral-line length of the bend zone; it stays the same at every angle of the stroke. */
  readonly allowance: Mm;
  /** 2 x outside setback - allowance; above 90 degrees legs run to the outermost tangent (DIN 6935). */
  readonly deduction: Mm;
  /** Neutral line at `k * thickness` from the inside surface. */
  readonly k: number;
  /** Names the rule that gave the allowance, e.g. "DIN 6935". */
  readonly allowanceSource: string;
  /** The same as data; null when the allowance was taken over from a plan that does not keep it. */
  readonly allowanceBasis: AllowanceBasis | null;
  /** Middle of the bend zone. */
  readonly line: readonly [FlatPoint, FlatPoint];
  /**
   * The bend zone unfolded, counter-clockwise: tangent on the parent (end, start), then tangent on the
   * child (start, end): [parentStart, childStart, childEnd, parentEnd] with start and end as along `line`.
   */
  readonly zone: readonly [FlatPoint, FlatPoint, FlatPoint, FlatPoint];
  /** The sheet within the zone where it is not simply the whole zone (notches and windows taken off); else null. */
  readonly region: readonly FlatRegion[] | null;
  /** Index of the bend that is formed in the same stroke, turned the other way (an offset); else null. */
  readonly strokeWith: number | null;
  /** Angular tolerance in radians, null when the general tolerance holds. */
  readonly toleranceAngle: Rad | null;
  /** Plus and minus on the length of the flange that the bend carries; null when the general tolerance holds. */
  readonly toleranceLength: Mm | null;
}

/**
 * How far each bend is formed, by bend index, in radians turned through; 0 = flat.
 * Most of the time an entry is 0 or the bend's own angle; within a stroke, something between or beyond.
 */
export type FormedAngles = readonly number[];
