import type { Interval } from "../geometry/interval";

/** What stands on the bed while a stroke is made, as seen from the station in use. */
export interface Standing {
  /** From the station's middle to the run's middle, mm; 0 for the station's own tools. */
  readonly offset: number;
  readonly length: number;
  /** Where this tool must not stand, from the middle of the stroke's line, mm. */
  readonly forbidden: readonly Interval[];
}

/** mm. Two ends that meet within this do not overlap: over rounding noise, far under any tolerance. */
const TOUCHING_MM = 1e-6;

/**
 * Where along a station the middle of a bend line may lie, from the station's middle: within `reach` either
 * way, and such that no run overlaps an interval where it must not stand. Exact arithmetic of intervals.
 */
export function freeShifts(reach: number, standing: readonly Standing[]): readonly Interval[] {
  if (reach < -TOUCHING_MM) return [];
  const limit = Math.max(0, reach);
  const blocked: [number, number][] = [];
  for (const { offset, length, forbidden } of standing) {
    for (const [from, to] of forbidden) blocked.push([offset - length / 2 - to + TOUCHING_MM, offset + length / 2 - from - TOUCHING_MM]);
  }
  blocked.sort((a, b) => a[0] - b[0]);
  const free: Interval[] = [];
  let at = 0 - limit;
  for (const [from, to] of blocked) {
    if (from >= limit) break;
    if (from >= at) free.push([at, from]);
    at = Math.max(at, to);
  }
  if (at <= limit) free.push([at, limit]);
  return free;
}
