import type { Vec2 } from "../../../geometry/vec2";
import type { HemKind } from "../../../part/partDocument";

/** Something in the file that was not as expected, and what was done about it. */
export interface DxfNote {
  /** Line of the file, from 1. */
  readonly line: number;
  readonly message: string;
}

/** A drawing file as read: entities with their places in the file, blocks not yet put in. Lengths in drawing units. */
export interface DxfDrawing {
  readonly header: DxfHeader;
  readonly layers: ReadonlyMap<string, DxfLayer>;
  readonly lineTypes: ReadonlyMap<string, DxfLineType>;
  readonly blocks: ReadonlyMap<string, DxfBlock>;
  readonly entities: readonly DxfEntity[];
  readonly notes: readonly DxfNote[];
  /** Notes beyond those kept. */
  readonly moreNotes: number;
}

export interface DxfHeader {
  /** $INSUNITS: 1 inch, 2 foot, 4 mm, 5 cm, 6 m; 0 or null when not said. */
  readonly units: number | null;
  /** $MEASUREMENT: 0 imperial, 1 metric. */
  readonly measurement: number | null;
  readonly version: string | null;
}

export interface DxfLayer {
  readonly name: string;
  readonly colour: number;
  readonly lineType: string;
  /** Switched off, frozen or not plotted. */
  readonly hidden: boolean;
}

export interface DxfLineType {
  readonly name: string;
  /** Made of dashes, by its pattern. */
  readonly dashed: boolean;
}

export interface DxfBlock {
  readonly name: string;
  readonly base: Vec2;
  readonly entities: readonly DxfEntity[];
}

export interface EntityHead {
  readonly line: number;
  readonly handle: string | null;
  readonly layer: string;
  /** Colour index: 0 as the block, 256 as the layer. */
  readonly colour: number;
  readonly lineType: string;
  /** In paper space or marked invisible. */
  readonly hidden: boolean;
  /** What our own files say of a bend line, or another program's extended data under the same name. */
  readonly bend: BendData | null;
}

/** Carried along with a bend line in extended data (group 1001 FOLDWRIGHT): nothing else in DXF can hold it. */
export interface BendData {
  readonly id: string;
  /** Degrees turned through. */
  readonly angle: number;
  readonly direction: "up" | "down";
  readonly hem: HemKind | null;
  /** In millimetres. */
  readonly insideRadius: number;
  /** Null where the allowance answers to no K from 0 to 1: the rule gives it again. */
  readonly k: number | null;
}

export type DxfEntity = EntityHead & DxfShape;

/** `mirrored`: drawn seen from below (extrusion 0, 0, -1); coordinates are already turned round. */
export type DxfShape =
  | { readonly kind: "LINE"; readonly from: Vec2; readonly to: Vec2 }
  | { readonly kind: "CONIC"; readonly source: "ARC" | "CIRCLE" | "ELLIPSE"; readonly centre: Vec2; readonly u: Vec2; readonly v: Vec2; readonly start: number; readonly sweep: number }
  | { readonly kind: "POLYLINE"; readonly points: readonly BulgedPoint[]; readonly closed: boolean }
  | { readonly kind: "SPLINE"; readonly degree: number; readonly knots: readonly number[]; readonly points: readonly Vec2[]; readonly weights: readonly number[] | null }
  | { readonly kind: "INSERT"; readonly block: string; readonly at: Vec2; readonly scale: Vec2; readonly rotation: number; readonly columns: number; readonly rows: number; readonly spacing: Vec2; readonly mirrored: boolean }
  | { readonly kind: "TEXT"; readonly text: string; readonly at: Vec2 }
  | { readonly kind: "POINT"; readonly at: Vec2 };

/** x, y and the bulge of the edge that starts there. */
export type BulgedPoint = readonly [number, number, number];
