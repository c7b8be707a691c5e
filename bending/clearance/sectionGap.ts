import type { Outline } from "./convexPiece";

let placed = new Float64Array(2 * 64);

/**
 * How far a cross-section (a, b each), posed by the numbers at `at` of `poses`, surely stands off a convex outline that stands
 * `lift` higher (separating axes: over 0 exactly when they are apart); when they overlap, below 0: how far the outline would have to
 * move, across one of its own sides, to come free.
 */
export function sectionGap(section: Float64Array, poses: Float64Array, at: number, { planes, corners }: Outline, lift: number): number {
  const count = section.length;
  if (placed.length < count) placed = new Float64Array(count);
  const sin = poses[at] as number;
  const cos = poses[at + 1] as number;
  const x = poses[at + 2] as number;
  const y = (poses[at + 3] as number) - lift;
  for (let i = 0; i < count; i += 2) {
    const a = section[i] as number;
    const b = section[i + 1] as number;
    placed[i] = x + a * cos - b * sin;
    placed[i + 1] = y + a * sin + b * cos;
  }
  let widest = -Infinity;
  for (let p = 0; p < planes.length; p += 3) {
    const nx = planes[p] as number;
    const ny = planes[p + 1] as number;
    let least = Infinity;
    for (let i = 0; i < count; i += 2) {
      const off = nx * (placed[i] as number) + ny * (placed[i + 1] as number);
      if (off < least) least = off;
    }
    least -= planes[p + 2] as number;
    if (least > widest) widest = least;
  }
  if (widest > 0) return widest;
  for (let i = 0; i < count; i += 2) {
    const px = placed[i] as number;
    const py = placed[i + 1] as number;
    const next = i + 2 < count ? i + 2 : 0;
    const nx = (placed[next + 1] as number) - py;
    const ny = px - (placed[next] as number);
    let least = Infinity;
    for (let j = 0; j < corners.length; j += 2) {
      const off = nx * ((corners[j] as number) - px) + ny * ((corners[j + 1] as number) - py);
      if (off <= 0) { least = off; break; }
      if (off < least) least = off;
    }
    if (least > 0) return least === Infinity ? Infinity : least / Math.hypot(nx, ny);
  }
  return widest;
}
