import type { Bend } from "../part/partModel";

/**
 * From the end of a face's plane part to the outside of its bend, when the bend really has `bent`'s angle and radius:
 * to the apex up to 90 degrees, to the outermost tangent above (as `outsideSetback`); the drawn angle says which.
 */
export function outsideReach(drawn: Bend, bent: Bend, thickness: number): number {
  const outer = bent.insideRadius + thickness;
  return drawn.angle > Math.PI / 2 + 1e-9 ? outer : outer * Math.tan(bent.angle / 2);
}
