import type { Vec2 } from "../../../geometry/vec2";
import type { BendData, BulgedPoint, DxfNote } from "../read/dxfDrawing";

/** A curve in the drawing's plane, blocks put in; drawing units. */
export type Curve =
  | { readonly kind: "LINE"; readonly from: Vec2; readonly to: Vec2 }
  | { readonly kind: "CONIC"; readonly centre: Vec2; readonly u: Vec2; readonly v: Vec2; readonly start: number; readonly sweep: number }
  | { readonly kind: "POLYLINE"; readonly points: readonly BulgedPoint[]; readonly closed: boolean }
  | { readonly kind: "SPLINE"; readonly degree: number; readonly knots: readonly number[]; readonly points: readonly Vec2[]; readonly weights: readonly number[] | null };

export interface PlacedShape {
  readonly curve: Curve;
  /** The kind of the entity as the file names it, e.g. "LINE", and its line in the file. */
  readonly source: string;
  readonly line: number;
  readonly layer: string;
  /** 1 to 255. */
  readonly colour: number;
  readonly lineType: string;
  readonly dashed: boolean;
  readonly hidden: boolean;
  readonly bend: BendData | null;
}

export interface PlacedDrawing {
  readonly shapes: readonly PlacedShape[];
  readonly texts: readonly string[];
  /** Blocks that are asked for and not in the file. */
  readonly notes: readonly DxfNote[];
}
