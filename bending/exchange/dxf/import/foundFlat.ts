import type { Vec2 } from "../../../geometry/vec2";
import type { BendDirection } from "../../../part/partDocument";
import type { BendData } from "../read/dxfDrawing";
import type { Loop, Repair } from "../contour/piece";

/** What the drawing holds, sorted by the choices made; mm, where it was drawn. */
export interface FoundFlat {
  /** The sheet's edge; null when no contour closes. */
  readonly outline: Loop | null;
  readonly holes: readonly Loop[];
  readonly bends: readonly FoundBend[];
  readonly repairs: readonly Repair[];
  readonly leftovers: readonly Leftover[];
  /** Closed contours in order of area, for choosing another one. */
  readonly contours: readonly Loop[];
  /** Straight lines inside the contour that are drawn like it and close nothing. */
  readonly singleLines: readonly (readonly [Vec2, Vec2])[];
}

export interface FoundBend {
  readonly line: readonly [Vec2, Vec2];
  readonly direction: BendDirection;
  /** What the file itself says of the bend. */
  readonly data: BendData | null;
}

/** Something drawn that went into neither contour nor bend. */
export interface Leftover {
  readonly what: string;
  readonly at: Vec2;
  readonly path: readonly Vec2[];
}
