import { SAME_POINT_MM } from "../core/tolerance";
import type { Vec2 } from "../geometry/vec2";
import { onEdge, type EdgeAxes } from "./edgeCut";

/** A hair beyond the corner, so that rounding leaves no sliver along a square side (mm). */
const BEYOND_MM = 0.01;

/**
 * How far past the end of an edge a strip of the given depth has to run to take the whole corner: over a
 * blunt corner, a chamfer or a rounding until the outline is as deep as the strip. 0 at a re-entrant corner,
 * where the material beyond belongs to the next edge.
 */
export function cornerReach(points: readonly Vec2[], axes: EdgeAxes, depth: number, at: "start" | "end"): number {
  const n = points.length;
  const step = at === "end" ? 1 : -1;
  const beyond = (along: number) => (at === "end" ? along - axes.length : -along);
  const corner = at === "end" ? axes.length : 0;
  const first = points.findIndex((p) => {
    const [a, h] = onEdge(axes, p);
    return Math.abs(a - corner) <= SAME_POINT_MM && Math.abs(h) <= SAME_POINT_MM;
  });
  let reach = 0;
  let [lastAlong, lastDepth] = [corner, 0];
  for (let k = 1; first >= 0 && k < n; k++) {
    const p = points[(first + step * k + n * n) % n];
    if (!p) break;
    const [along, h] = onEdge(axes, p);
    if (h <= lastDepth) return k === 1 ? 0 : reach + BEYOND_MM;
    if (h >= depth) {
      const crossing = lastAlong + ((along - lastAlong) * (depth - lastDepth)) / (h - lastDepth);
      return Math.max(reach, beyond(crossing)) + BEYOND_MM;
    }
    reach = Math.max(reach, beyond(along));
    [lastAlong, lastDepth] = [along, h];
  }
  return reach + BEYOND_MM;
}
