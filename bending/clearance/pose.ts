import type { Mm } from "../core/units";
import type { Bend } from "../part/partModel";

/** Where the wings stand, seen from the punch's tip (x to the back, y up). */
export interface WingPose {
  readonly sin: number;
  readonly cos: number;
  /** Tangent of the back wing's outside surface. */
  readonly x: number;
  readonly y: number;
}

/** Seen from the punch the sheet's pose depends on the angle alone (h is half of it), not on the die: see `strokePlacement`. */
export function wingPose(bend: Bend, thickness: Mm, h: number): WingPose {
  const [sin, cos] = [Math.sin(h), Math.cos(h)];
  const outer = (1 - bend.k) * thickness;
  const neutral = bend.allowance / 2;
  const rise = h < 1e-9 ? h / 2 : (2 * Math.sin(h / 2) ** 2) / h;
  return { sin, cos, x: neutral * (h < 1e-9 ? 1 : sin / h) + outer * sin, y: neutral * rise + outer * (1 - cos) - thickness };
}
