import type { Mm } from "../core/units";
import type { Die } from "../tooling/tool";
import type { Shape } from "./convexPiece";
import { shapeOf } from "./shapeOf";

/** A die for the clip, in its front (left) and its back (right) half: the wing over a half may touch it. */
export function dieShape(die: Die, margin: Mm): Shape {
  return shapeOf(die.profile, margin, { point: [0, 0], normal: [1, 0], before: "left", beyond: "right" });
}
