import type { Mm } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import type { Shape } from "./convexPiece";
import type { Obstacle } from "./obstacle";
import { sweepShape } from "./sweepShape";

/**
 * One way for the part between the tools and the operator; going in is the same way back.
 * `pull`: the ram opens, the part is lifted out of the die and drawn straight to the operator.
 * `slide`: the ram opens, the part is lifted and slid along the bed past everything.
 * `closed`: the ram stays, the part is slid along the bed.
 */
export interface AccessMotion {
  readonly kind: "pull" | "slide" | "closed";
  readonly lift: number;
}

/** mm. Farther than any part reaches. */
const AWAY = 1e4;

/** What an obstacle goes through, seen from the part: where it may not stand beside the part, and where it may not stand at all. */
export interface AccessShapes {
  readonly passed: Shape;
  /** Met anywhere along z, it is met somewhere on the way along the bed. */
  readonly everywhere: Shape;
}

/** The motion as shapes seen from the punch's tip at rest; `base`: height of the obstacle's origin over the tip; `opening`: how far the ram goes up. */
export function accessShapes(motion: AccessMotion, obstacle: Obstacle, base: number, opening: number, margin: Mm): AccessShapes {
  const still: Vec2 = [0, 0];
  if (motion.kind === "closed") return { passed: [], everywhere: sweepShape(obstacle.shape, [0, base], still, margin) };
  const up = obstacle.on === "ram" ? opening : 0;
  const apart = base + up - motion.lift;
  const parting = obstacle.on === "ram" ? sweepShape(obstacle.shape, [0, base], [0, opening], margin) : sweepShape(obstacle.shape, [0, base], [0, -motion.lift], margin);
  return motion.kind === "pull"
    ? { passed: [...parting, ...sweepShape(obstacle.shape, [0, apart], [AWAY, 0], margin)], everywhere: [] }
    : { passed: parting, everywhere: sweepShape(obstacle.shape, [0, apart], still, margin) };
}
