/**
 * A convex plate that moves with a wing: `count` corners on one side, then `count` on the other, each three numbers:
 * a (away from the bend, from the tangent on the wing's outside surface), b (from the outside surface to the inside), z.
 */
export interface Prism {
  /** A piece of a face, or a facet of the bend zone beside it. */
  readonly of: "face" | "zone";
  readonly count: number;
  readonly points: Float64Array;
  /** Where it is the same at every z that it reaches: its cross-section, counter-clockwise, a and b each; else null. */
  readonly section: Float64Array | null;
  /** How the prism lies to its wing: `plane` in the wing's plane, `inside` on or over its outside surface, `outside` else. */
  readonly lies: "plane" | "inside" | "outside";
  readonly a: readonly [number, number];
  readonly b: readonly [number, number];
  readonly z: readonly [number, number];
}
