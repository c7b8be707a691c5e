import type { Vec2 } from "../../../geometry/vec2";

/** A straight or round edge between two points, in mm; bulge as in DXF (tangent of a quarter of the angle, 0 straight). */
export interface Piece {
  readonly from: Vec2;
  readonly to: Vec2;
  readonly bulge: number;
  /** Index of the shape that it was drawn with. */
  readonly shape: number;
}

/** What was mended, where (mm, in the drawing's own place) and how large it was. */
export interface Repair {
  readonly kind: "no length" | "drawn twice" | "overlap" | "gap" | "crossing" | "joined" | "slit";
  readonly at: Vec2;
  readonly message: string;
}

/** A closed contour. */
export interface Loop {
  readonly vertices: readonly (readonly [number, number, number])[];
  readonly circle: { readonly centre: Vec2; readonly radius: number } | null;
  /** Shapes that it was drawn with. */
  readonly shapes: readonly number[];
  /** mm², positive; arcs exact. */
  readonly area: number;
}
