import type { Vec2 } from "../geometry/vec2";
import type { DimensionKind } from "./partDocument";
import type { FlatCircle } from "./partModel";

/**
 * A face as drawn, in local coordinates in which it is seen from the base's top: the base's own, or for a
 * flange x along the bend from the flange's start and y = minus the distance from the bend's outside line.
 */
export interface DrawnFace {
  /** Counter-clockwise, arcs as chords. */
  readonly points: readonly Vec2[];
  /** The document's edges by number, each in counter-clockwise sense. */
  readonly edges: readonly DrawnEdge[];
  /** How the face's lengths are measured to its bends. */
  readonly dimension: DimensionKind;
  /** The edge whose flanges carry a chain on: the far edge of a flange given by its length. */
  readonly chainEdge: number | null;
  /** Of the arcs that the chords stand for, in local coordinates. */
  readonly circles: readonly FlatCircle[];
}

export interface DrawnEdge {
  readonly from: Vec2;
  readonly to: Vec2;
}
