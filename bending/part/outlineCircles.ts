import type { Vec2 } from "../geometry/vec2";
import type { DocumentVertex } from "./partDocument";
import type { FlatCircle } from "./partModel";

/** The circles on which the bulged edges of a drawn outline lie. */
export function outlineCircles(outline: readonly DocumentVertex[]): readonly FlatCircle[] {
  return outline.flatMap((vertex, i): readonly FlatCircle[] => {
    const next = outline[(i + 1) % outline.length] ?? vertex;
    return vertex[2] === undefined || vertex[2] === 0 ? [] : [arcCircle([vertex[0], vertex[1]], [next[0], next[1]], vertex[2])];
  });
}

/** The circle through two points whose arc between them has the given bulge; its centre lies to the left of a counter-clockwise arc of less than half a turn. */
function arcCircle(from: Vec2, to: Vec2, bulge: number): FlatCircle {
  const chord = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const half = 2 * Math.atan(bulge);
  const toCentre = chord / 2 / Math.tan(half);
  const [ux, uy] = [(to[0] - from[0]) / chord, (to[1] - from[1]) / chord];
  return {
    centre: [(from[0] + to[0]) / 2 - uy * toCentre, (from[1] + to[1]) / 2 + ux * toCentre],
    radius: chord / (2 * Math.abs(Math.sin(half))),
  };
}
