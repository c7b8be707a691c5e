import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { Mm } from "../core/units";
import type { Vec2 } from "../geometry/vec2";
import type { Shape } from "./convexPiece";
import { convexHull } from "../geometry/convexHull";
import { pieceOf } from "./pieceOf";

/** What a shape goes through when it first stands at `from` (an offset) and then moves straight by `by`: exact for each convex piece. */
export function sweepShape(shape: Shape, from: Vec2, by: Vec2, margin: Mm): Shape {
  return shape.map(({ role, corners }) => {
    const start = corners.map((p): Vec2 => [p[0] + from[0], p[1] + from[1]]);
    const swept = by[0] === 0 && by[1] === 0 ? start : convexHull([...start, ...start.map((p): Vec2 => [p[0] + by[0], p[1] + by[1]])]);
    return pieceOf(role, swept, margin, () => -MEANT_CONTACT_MM);
  });
}
