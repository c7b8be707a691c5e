import { SAME_POINT_MM } from "../core/tolerance";
import type { FlatPoint, Vec2 } from "../geometry/vec2";
import type { Bend, PartModel } from "./partModel";

/**
 * The outer outline of the unfolded sheet, counter-clockwise: each child's outline spliced into its parent's
 * edge by way of the bend zone. Exact, as nothing is intersected: a zone meets its faces along whole edges.
 */
export function developedOutline(part: Pick<PartModel, "faces" | "bends">): readonly FlatPoint[] {
  const carried = part.faces.map((): Bend[] => []);
  for (const bend of part.bends) carried[bend.parent]?.push(bend);
  const path: FlatPoint[] = [];
  const goRound = (face: number, from: number) => {
    const outline = part.faces[face]?.outline ?? [];
    const n = outline.length;
    const startsAt = new Map((carried[face] ?? []).map((bend) => [nearestCorner(outline, bend.zone[0], bend.zone[3]), bend]));
    for (let i = 0; i < n; i++) {
      const corner = (from + i) % n;
      path.push(outline[corner] ?? [0, 0]);
      const bend = startsAt.get(corner);
      if (!bend) continue;
      const [parentStart, childStart, childEnd, parentEnd] = bend.zone;
      const child = part.faces[bend.child]?.outline ?? [];
      path.push(parentStart, childStart);
      // Its last edge is the one on the bend, which is not part of the outer outline.
      goRound(bend.child, nearestCorner(child, childStart, null));
      path.push(childEnd, parentEnd);
    }
  };
  goRound(0, 0);
  return withoutRepeats(path);
}

/** The corner at a point; where two are near, the one that the outline leaves towards `next`. */
function nearestCorner(outline: readonly Vec2[], point: Vec2, next: Vec2 | null): number {
  let best = 0;
  let least = Infinity;
  outline.forEach((p, i) => {
    const near = Math.abs(p[0] - point[0]) + Math.abs(p[1] - point[1]);
    if (near >= least) return;
    const q = outline[(i + 1) % outline.length] ?? p;
    const off = near + (next ? Math.abs(q[0] - next[0]) + Math.abs(q[1] - next[1]) : 0);
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
