import { SAME_POINT_MM } from "../core/tolerance";
import type { FlatPoint } from "../geometry/vec2";
import { contourAsChords } from "./contourAsChords";
import { developedOutline } from "./developedOutline";
import type { PartModel } from "./partModel";

/** The outer outline of the flat, counter-clockwise, arcs as chords, without points in the middle of straight runs. */
export function flatOutline(part: PartModel): readonly FlatPoint[] {
  return part.drawnFlat ? contourAsChords(part.drawnFlat.outline) : withoutMidpoints(developedOutline(part));
}

/** The tip of a slit, where the outline turns back, stays. */
function withoutMidpoints(outline: readonly FlatPoint[]): readonly FlatPoint[] {
  const kept: FlatPoint[] = [];
  outline.forEach((q, i) => {
    const p = kept[kept.length - 1] ?? outline[outline.length - 1] ?? q;
    const r = outline[(i + 1) % outline.length] ?? q;
    const [ux, uy, vx, vy] = [q[0] - p[0], q[1] - p[1], r[0] - q[0], r[1] - q[1]];
    const straightOn = ux * vx + uy * vy > 0 && Math.abs(ux * vy - uy * vx) <= SAME_POINT_MM * Math.max(Math.hypot(ux, uy), Math.hypot(vx, vy));
    if (!straightOn) kept.push(q);
  });
  return kept;
}
