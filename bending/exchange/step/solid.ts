import type { Vec3 } from "../../geometry/vec3";

/**
 * A solid body as plain data, in millimetres: faces bounded by loops of edges, as in ISO 10303-42. Coplanar neighbours are one
 * face. Faces are numbered from 0 here and from 1 where a person reads them.
 */
export interface Solid {
  readonly faces: readonly SolidFace[];
  readonly edges: readonly SolidEdge[];
  readonly vertices: readonly Vec3[];
  /** mm³. */
  readonly volume: number;
}

export interface SolidFace {
  readonly surface: Surface;
  /** mm². */
  readonly area: number;
  /** In no order: which loop is the outer one follows from the geometry. */
  readonly loops: readonly Loop[];
}

export type Surface = PlaneSurface | CylinderSurface | OtherSurface;

export interface PlaneSurface {
  readonly kind: "plane";
  readonly point: Vec3;
  /** Out of the material, of length 1. */
  readonly normal: Vec3;
}

export interface CylinderSurface {
  readonly kind: "cylinder";
  readonly point: Vec3;
  /** Along the axis, of length 1; either sense. */
  readonly axis: Vec3;
  readonly radius: number;
  /** The material lies inside (a shaft) and not outside (a hole). */
  readonly convex: boolean;
}

export interface OtherSurface {
  readonly kind: "other";
  /** In plain words, e.g. "cone". */
  readonly name: string;
}

/** Edges end to end, the material of the face on the left as seen from outside. */
export type Loop = readonly LoopEdge[];

export interface LoopEdge {
  readonly edge: number;
  /** Run through from `from` to `to`. */
  readonly forward: boolean;
}

export interface SolidEdge {
  readonly curve: EdgeCurve;
  /** Vertices; the same one twice for a closed edge. */
  readonly from: number;
  readonly to: number;
}

export type EdgeCurve =
  | { readonly kind: "line" }
  | { readonly kind: "circle"; readonly centre: Vec3; readonly axis: Vec3; readonly radius: number; readonly middle: Vec3 }
  /** Points between the two ends, close enough to be drawn as chords. */
  | { readonly kind: "other"; readonly between: readonly Vec3[] };
