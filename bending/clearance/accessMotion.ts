import type { Mm } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import type { Shape } from "./convexPiece";
import { mirrorShape } from "./mirrorShape";
import type { Obstacle } from "./obstacle";
import { placedShape, type PlacedShape } from "./placedShape";
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
export const AWAY_MM = 1e4;

/** What an obstacle goes through, seen from a half at the back: where it may not stand beside the part, and where it may not stand at all. */
export interface AccessShapes {
  readonly passed: PlacedShape;
  /** Met anywhere along z, it is met somewhere on the way along the bed. */
  readonly everywhere: PlacedShape;
}

/** The same for a half at the back and for one in front; one object when there is no difference. */
export interface AccessSides {
  readonly back: AccessShapes;
  readonly front: AccessShapes;
}

/** The motion as shapes seen from the punch's tip at rest; `base`: height of the obstacle's origin over the tip; `opening`: how far the ram goes up. */
export function accessShapes(motion: AccessMotion, obstacle: Obstacle, base: number, opening: number, margin: Mm): AccessSides {
  const { passed, everywhere } = shapes(motion, obstacle, base, opening, margin);
  const back = { passed: placedShape(passed), everywhere: placedShape(everywhere) };
  if (motion.kind !== "pull" && obstacle.shape === obstacle.turned) return { back, front: back };
  return { back, front: { passed: placedShape(mirrorShape(passed)), everywhere: placedShape(mirrorShape(everywhere)) } };
}

function shapes(motion: AccessMotion, { on, shape: { pieces } }: Obstacle, base: number, opening: number, margin: Mm): { readonly passed: Shape; readonly everywhere: Shape } {
  const still: Vec2 = [0, 0];
  if (motion.kind === "closed") return { passed: [], everywhere: sweepShape(pieces, [0, base], still, margin) };
  const apart = base + (on === "ram" ? opening : 0) - motion.lift;
  const parting = sweepShape(pieces, [0, base], on === "ram" ? [0, opening] : [0, -motion.lift], margin);
  return motion.kind === "pull"
    ? { passed: [...parting, ...sweepShape(pieces, [0, apart], [AWAY_MM, 0], margin)], everywhere: [] }
    : { passed: parting, everywhere: sweepShape(pieces, [0, apart], still, margin) };
}
