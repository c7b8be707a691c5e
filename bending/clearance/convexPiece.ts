import type { Vec2 } from "../geometry/vec2";

/**
 * A part of a tool that a rule of contact holds for: `tip` of a punch (the wings may touch it), `body` of anything,
 * `left` and `right` half of a die (the wing over that half may touch it).
 */
export type PieceRole = "tip" | "body" | "left" | "right";

/** A convex polygon as half-planes (nx x + ny y <= c; three numbers each) and as corners (two numbers each; none when nothing is left). */
export interface Outline {
  readonly planes: Float64Array;
  readonly corners: Float64Array;
}

/** A convex piece of a profile, twice: kept off by the margin, and without its skin. */
export interface ConvexPiece {
  readonly role: PieceRole;
  readonly corners: readonly Vec2[];
  readonly withMargin: Outline;
  readonly withoutSkin: Outline;
  /** Left, right, bottom and top of the piece with its margin. */
  readonly box: readonly [number, number, number, number];
}

/** A tool's or a machine's cross-section, ready for the clip. */
export type Shape = readonly ConvexPiece[];
