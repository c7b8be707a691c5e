import { SAME_POINT_MM } from "../core/tolerance";

/** What the clip found: `separation` over 0 (or as good as 0) when a side of the piece parts them, else the z-extent of what they share (empty when from > to). */
export interface Clipped {
  /** Below 0: how far the piece would have to move, across one of its sides, to come free. */
  separation: number;
  from: number;
  to: number;
}

/** Corners that a clipped side of a prism can have: its own and one more for each half-plane. */
const MOST = 4096;
let source = new Float64Array(3 * MOST);
let target = new Float64Array(3 * MOST);
/** The half-planes that cut the prism at all (nx, ny, c with the lift in it). */
const cutting = new Float64Array(3 * MOST);

/**
 * A convex prism against a convex piece of a profile swept along z. The shared solid's z-extent is reached on the prism's
 * surface (the piece is the same at every z), so each side of the prism is clipped by the half-planes and what is left is
 * measured: exact but for rounding. `points`: x, y, z a corner, `count` on one side, then `count` on the other.
 * `lift`: the piece stands that much higher.
 */
export function clipPrism(points: Float64Array, count: number, planes: Float64Array, lift: number, out: Clipped): void {
  out.from = Infinity;
  out.to = -Infinity;
  const cuts = separate(points, 6 * count, planes, lift, out);
  if (out.separation > -SAME_POINT_MM) return;
  for (let first = 0; first <= 3 * count; first += 3 * count) {
    for (let i = 0; i < 3 * count; i++) source[i] = points[first + i] as number;
    clipSide(count, cuts, out);
  }
  for (let k = 0; k < count; k++) {
    const [here, next] = [3 * k, 3 * ((k + 1) % count)];
    for (let j = 0; j < 3; j++) {
      source[j] = points[here + j] as number;
      source[3 + j] = points[next + j] as number;
      source[6 + j] = points[3 * count + next + j] as number;
      source[9 + j] = points[3 * count + here + j] as number;
    }
    clipSide(4, cuts, out);
  }
}

/** Writes the widest separation, and gives how many half-planes cut the prism. */
function separate(points: Float64Array, length: number, planes: Float64Array, lift: number, out: Clipped): number {
  let widest = -Infinity;
  let cuts = 0;
  for (let p = 0; p < planes.length; p += 3) {
    const nx = planes[p] as number;
    const ny = planes[p + 1] as number;
    const c = (planes[p + 2] as number) + ny * lift;
    let least = Infinity;
    let most = -Infinity;
    for (let i = 0; i < length; i += 3) {
      const off = nx * (points[i] as number) + ny * (points[i + 1] as number) - c;
      if (off < least) least = off;
      if (off > most) most = off;
    }
    if (least > widest) widest = least;
    if (most > 0) {
      cutting[cuts] = nx;
      cutting[cuts + 1] = ny;
      cutting[cuts + 2] = c;
      cuts += 3;
    }
  }
  out.separation = widest;
  return cuts;
}

/** Sutherland and Hodgman's clip of the side in `source`, in x and y, with z carried along. */
function clipSide(count: number, cuts: number, out: Clipped): void {
  let left = count;
  for (let p = 0; p < cuts && left > 0; p += 3) {
    left = cut(left, cutting[p] as number, cutting[p + 1] as number, cutting[p + 2] as number);
    const swap = source;
    source = target;
    target = swap;
  }
  for (let i = 2; i < 3 * left; i += 3) {
    const z = source[i] as number;
    if (z < out.from) out.from = z;
    if (z > out.to) out.to = z;
  }
}

/** One half-plane: from `source` to `target`; gives the count of corners kept. */
function cut(count: number, nx: number, ny: number, c: number): number {
  let kept = 0;
  let previous = 3 * (count - 1);
  let offPrevious = nx * (source[previous] as number) + ny * (source[previous + 1] as number) - c;
  for (let here = 0; here < 3 * count; here += 3) {
    const off = nx * (source[here] as number) + ny * (source[here + 1] as number) - c;
    if (off <= 0 !== offPrevious <= 0) {
      const share = offPrevious / (offPrevious - off);
      for (let j = 0; j < 3; j++) {
        const from = source[previous + j] as number;
        target[kept + j] = from + share * ((source[here + j] as number) - from);
      }
      kept += 3;
    }
    if (off <= 0) {
      for (let j = 0; j < 3; j++) target[kept + j] = source[here + j] as number;
      kept += 3;
    }
    previous = here;
    offPrevious = off;
  }
  return kept / 3;
}
