import type { Mm } from "../core/units";
import type { Punch } from "../tooling/tool";
import type { Shape } from "./convexPiece";
import { shapeOf } from "./shapeOf";

/** Radians (2 degrees). How far a side may lean off the stated tip angle and still be a flank. */
const FLANK_LEAN = (2 * Math.PI) / 180;

/**
 * A punch for the clip. Its tip, up to where the flanks end and so far over it that a wing which lies along the flank is
 * off the body by the margin, may be touched by the wings; the margin holds for the body over it.
 */
export function punchShape(punch: Punch, margin: Mm): Shape {
  const half = punch.tipAngle / 2;
  const steepest = Math.tan(half + FLANK_LEAN);
  const flattest = Math.tan(Math.max(half - FLANK_LEAN, 0.01));
  let top = 0;
  punch.profile.forEach((p, i) => {
    for (const q of [punch.profile[i - 1], punch.profile[(i + 1) % punch.profile.length]]) {
      const [out, up] = q ? [Math.abs(p[0]) - Math.abs(q[0]), p[1] - q[1]] : [0, 0];
      const flank = q && p[0] * q[0] >= 0 && up > 0 && out >= flattest * up && out <= steepest * up;
      if (flank && Math.abs(p[0]) <= steepest * p[1] + punch.tipRadius) top = Math.max(top, p[1]);
    }
  });
  const height = Math.max(top, punch.tipRadius) + margin * (1.05 + 1 / Math.tan(half));
  return shapeOf(punch.profile, margin, { point: [0, height], normal: [0, 1], before: "tip", beyond: "body" });
}
