import type { Vec2 } from "../geometry/vec2";
import type { Bend } from "./partModel";

export interface BendDirections {
  /** Unit vector along the bend line, from its start to its end; the parent is on its left. */
  readonly along: Vec2;
  /** Unit vector across it, from the parent to the child. */
  readonly outward: Vec2;
}

export function bendDirections(bend: Bend): BendDirections {
  const [start, end] = bend.line;
  const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
  const along: Vec2 = [(end[0] - start[0]) / length, (end[1] - start[1]) / length];
  return { along, outward: [along[1], -along[0]] };
}
