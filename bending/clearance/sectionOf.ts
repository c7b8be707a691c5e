import { SAME_POINT_MM } from "../core/tolerance";
import { convexHull } from "../geometry/convexHull";
import type { Vec2 } from "../geometry/vec2";

/** The cross-section (a, b) of a plate's corners (a, b, z each) when every corner at one end of its z-extent has one like it at the other; else null. */
export function sectionOf(points: Float64Array, [low, high]: readonly [number, number]): Float64Array | null {
  const ends: [Vec2[], Vec2[]] = [[], []];
  for (let i = 0; i < points.length; i += 3) {
    const z = points[i + 2] as number;
    const corner: Vec2 = [points[i] as number, points[i + 1] as number];
    if (z - low < SAME_POINT_MM) ends[0].push(corner);
    else if (high - z < SAME_POINT_MM) ends[1].push(corner);
    else return null;
  }
  const alike = (one: readonly Vec2[], other: readonly Vec2[]) =>
    one.every((p) => other.some((q) => Math.abs(p[0] - q[0]) < SAME_POINT_MM && Math.abs(p[1] - q[1]) < SAME_POINT_MM));
  return alike(ends[0], ends[1]) && alike(ends[1], ends[0]) ? Float64Array.from(convexHull(ends[0]).flat()) : null;
}
