import type { Vec2 } from "../../geometry/vec2";
import { cornerPoint } from "./cornerPoint";
import type { FlatZone } from "./flatZone";

/** The zone's corners counter-clockwise: right border from start to end, left border back. */
export function zoneQuad({ right, left }: Pick<FlatZone, "right" | "left">): readonly [Vec2, Vec2, Vec2, Vec2] {
  return [cornerPoint(right[0]), cornerPoint(right[1]), cornerPoint(left[1]), cornerPoint(left[0])];
}
