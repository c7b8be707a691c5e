import type { Vec2 } from "../geometry/vec2";
import type { Bend } from "./partModel";

/** How far an outline reaches from the line of a bend, mm in the sheet. */
export function faceReach(outline: readonly Vec2[], { line: [[ax, ay], [bx, by]] }: Bend): number {
  const length = Math.hypot(bx - ax, by - ay);
  return outline.reduce((far, [x, y]) => Math.max(far, Math.abs(((x - ax) * (by - ay) - (y - ay) * (bx - ax)) / length)), 0);
}
