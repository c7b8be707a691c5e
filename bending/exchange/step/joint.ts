import type { Vec3 } from "../../geometry/vec3";

/** A bend before it has a direction: the two plane faces on its inner side and the two on its outer side that it joins. */
export interface Joint {
  readonly axis: Vec3;
  /** Turned through, radians. */
  readonly angle: number;
  readonly insideRadius: number;
  /** The plane faces that meet the bend on the inner and the outer side, with the solid's edges along it. */
  readonly inner: readonly [JointSide, JointSide];
  readonly outer: readonly [JointSide, JointSide];
  readonly faces: readonly number[];
  /** Set when the outside corner is sharp: how far each outer face runs past where a round one would begin. */
  readonly overrun: number;
}

export interface JointSide {
  readonly face: number;
  readonly edges: readonly number[];
}
