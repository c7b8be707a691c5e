import type { Vec2 } from "../geometry/vec2";

/**
 * A part of a tool that a rule of contact holds for: `tip` of a punch (the wings may touch it), `body` of anything,
 * `left` and `right` half of a die (the wing over that half may touch it).
 */
export type PieceRole = "tip" | "body" | "left" | "right";

/** A convex piece of a profile as half-planes (nx x + ny y <= c; three numbers each), twice: kept off by the margin, and without its skin. */
export interface ConvexPiece {
  readonly role: PieceRole;
  readonly corners: readonly Vec2[];
  readonly withMargin: Float64Array;
  readonly withoutSkin: Float64Array;
  /** Left, right, bottom and top of the piece with its margin. */
  readonly box: readonly [number, number, number, number];
}

/** A tool's or a machine's cross-section, ready for the clip. */
export type Shape = readonly ConvexPiece[];
