import type { PlacedShape } from "./placedShape";

/** Something on the ram or on the bed, placed against the tools that make the hit; the same object for the same shape and place. */
export interface Obstacle {
  readonly kind: "punch" | "die" | "ram" | "bed";
  readonly tool: string | null;
  readonly shape: PlacedShape;
  /** The shape with front and back exchanged; the same object when that changes nothing. */
  readonly turned: PlacedShape;
  /** Things on the ram move with the punch, things on the bed stand with the die. */
  readonly on: "ram" | "bed";
  /** Height of its origin over the punch's tip (on the ram) or over the die's top plane (on the bed). */
  readonly lift: number;
}
