import type { Vec2 } from "@/bending/geometry/vec2";
import type { Bounds } from "./clipToBox";

/** The smallest box around all points; [0, 0, 0, 0] around none. */
export function boundsOf(loops: readonly (readonly Vec2[])[]): Bounds {
  const points = loops.flat();
  if (points.length === 0) return [0, 0, 0, 0];
  return points.reduce<Bounds>(
    ([left, top, right, bottom], [x, y]) => [Math.min(left, x), Math.min(top, y), Math.max(right, x), Math.max(bottom, y)],
    [Infinity, Infinity, -Infinity, -Infinity],
  );
}
