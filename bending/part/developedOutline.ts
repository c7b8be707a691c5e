import { invariant } from "../core/invariant";
import { SAME_POINT_MM } from "../core/tolerance";
import type { FlatPoint, Vec2 } from "../geometry/vec2";
import type { Bend, PartModel } from "./partModel";

/**
 * The outer outline of the unfolded sheet, counter-clockwise: each child's outline spliced into its parent's
 * edge by way of the bend zone. Exact, as nothing is intersected: faces and zones meet along whole edges.
 */
export function developedOutline(part: Pick<PartModel, "faces" | "bends">): readonly FlatPoint[] {
  const carried = part.faces.map((): Bend[] => []);
  for (const bend of part.bends) carried[bend.parent]?.push(bend);

  const around = (face: number, from: FlatPoint | null): readonly FlatPoint[] => {
    const outline = part.faces[face]?.outline ?? [];
    const bends = carried[face] ?? [];
    const n = outline.length;
    const path: FlatPoint[] = [];
    const first = from ? nearestCorner(outline, from) : 0;
    for (let i = 0; i < n; i++) {
      const p = outline[(first + i) % n];
      const q = outline[(first + i + 1) % n];
      invariant(p && q, "an outline has corners");
      // The child's own edge on its bend is not part of the outer outline.
      if (from && i === n - 1) {
        path.push(p);
        continue;
      }
      path.push(p);
      for (const bend of bends.filter((b) => liesOn(b, p, q)).sort((a, b) => along(a, p, q) - along(b, p, q))) {
        const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
        path.push(parentStart, childStart, ...around(bend.child, childStart), childEnd, parentEnd);
      }
    }
    return path;
  };
  return withoutRepeats(around(0, null));
}

/** Zones are built from the very edge, so rounding alone separates them; a few thousand ulps is plenty. */
const ON_EDGE_MM = 1e-5;

function liesOn(bend: Bend, p: Vec2, q: Vec2): boolean {
  const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
  if (length < SAME_POINT_MM) return false;
  const [ux, uy] = [(q[0] - p[0]) / length, (q[1] - p[1]) / length];
  return [bend.zone[0], bend.zone[3]].every((r) => {
    const a = (r[0] - p[0]) * ux + (r[1] - p[1]) * uy;
    const off = (r[0] - p[0]) * uy - (r[1] - p[1]) * ux;
    return Math.abs(off) < ON_EDGE_MM && a > -ON_EDGE_MM && a < length + ON_EDGE_MM;
  }) && (bend.zone[3][0] - bend.zone[0][0]) * ux + (bend.zone[3][1] - bend.zone[0][1]) * uy > 0;
}

const along = (bend: Bend, p: Vec2, q: Vec2) => (bend.zone[0][0] - p[0]) * (q[0] - p[0]) + (bend.zone[0][1] - p[1]) * (q[1] - p[1]);

function nearestCorner(outline: readonly Vec2[], point: Vec2): number {
  let best = 0;
  let least = Infinity;
  outline.forEach((p, i) => {
    const off = Math.hypot(p[0] - point[0], p[1] - point[1]);
    if (off < least) [best, least] = [i, off];
  });
  return best;
}

function withoutRepeats(path: readonly FlatPoint[]): readonly FlatPoint[] {
  return path.filter((p, i) => {
    const before = path[(i + path.length - 1) % path.length];
    return !before || Math.hypot(p[0] - before[0], p[1] - before[1]) > SAME_POINT_MM;
  });
}
