import { signedArea } from "../../geometry/signedArea";
import type { Vec2 } from "../../geometry/vec2";
import type { OutlineVertex } from "./recognisedPart";

/** Enclosed area with its true arcs, positive when counter-clockwise: the chords' area and a circular segment a bulge. */
export function outlineArea(outline: readonly OutlineVertex[]): number {
  const chords = signedArea(outline.map(([x, y]): Vec2 => [x, y]));
  return outline.reduce((sum, [x, y, bulge], i) => {
    const next = outline[(i + 1) % outline.length] ?? [x, y, 0];
    if (bulge === 0) return sum;
    const chord = Math.hypot(next[0] - x, next[1] - y);
    const sweep = 4 * Math.atan(bulge);
    const radius = chord / (2 * Math.sin(Math.abs(sweep) / 2));
    return sum + (Math.sign(bulge) * radius * radius * (Math.abs(sweep) - Math.sin(Math.abs(sweep)))) / 2;
  }, chords);
}
