/** What the clip found: `separation` > 0 when a side of the piece parts them, else the z-extent of what they share (empty when from > to). */
export interface Clipped {
  separation: number;
  from: number;
  to: number;
  /** How far in the deepest shared corner lies, mm. */
  depth: number;
}

/** Corners that a clipped side of a prism can have; a face's convex piece has at most as many less the piece's sides. */
const MOST = 4096;
let source = new Float64Array(3 * MOST);
let target = new Float64Array(3 * MOST);

/**
 * A convex prism against a convex piece of a profile swept along z. The shared solid's z-extent is reached on the prism's
 * surface (the piece is the same at every z), so each side of the prism is clipped by the half-planes and what is left is
 * measured: exact but for rounding. `points`: x, y, z a corner, `count` on one side, then `count` on the other.
 * `lift`: the piece stands that much higher.
 */
export function clipPrism(points: Float64Array, count: number, planes: Float64Array, lift: number, out: Clipped): void {
  out.from = Infinity;
  out.to = -Infinity;
  out.depth = 0;
  out.separation = separation(points, count, planes, lift);
  if (out.separation > 0) return;
  clipSide(points, planes, lift, out, count, (i) => i);
  clipSide(points, planes, lift, out, count, (i) => count + i);
  for (let k = 0; k < count; k++) {
    const next = (k + 1) % count;
    clipSide(points, planes, lift, out, 4, (i) => (i === 0 ? k : i === 1 ? next : i === 2 ? count + next : count + k));
  }
}

function separation(points: Float64Array, count: number, planes: Float64Array, lift: number): number {
  let widest = -Infinity;
  for (let p = 0; p < planes.length; p += 3) {
    const [nx, ny] = [planes[p] as number, planes[p + 1] as number];
    const c = (planes[p + 2] as number) + ny * lift;
    let least = Infinity;
    for (let i = 0; i < 6 * count; i += 3) {
      const off = nx * (points[i] as number) + ny * (points[i + 1] as number) - c;
      if (off < least) least = off;
    }
    if (least > widest) widest = least;
  }
  return widest;
}

/** Sutherland and Hodgman's clip of one side of the prism, in x and y, with z carried along. */
function clipSide(points: Float64Array, planes: Float64Array, lift: number, out: Clipped, count: number, corner: (i: number) => number): void {
  for (let i = 0; i < count; i++) {
    const from = 3 * corner(i);
    for (let j = 0; j < 3; j++) source[3 * i + j] = points[from + j] as number;
  }
  let left = count;
  for (let p = 0; p < planes.length && left > 0; p += 3) {
    left = cut(left, planes[p] as number, planes[p + 1] as number, (planes[p + 2] as number) + (planes[p + 1] as number) * lift);
    [source, target] = [target, source];
  }
  for (let i = 0; i < 3 * left; i += 3) {
    const z = source[i + 2] as number;
    if (z < out.from) out.from = z;
    if (z > out.to) out.to = z;
    let depth = Infinity;
    for (let p = 0; p < planes.length; p += 3) {
      const ny = planes[p + 1] as number;
      const inside = (planes[p + 2] as number) + ny * lift - (planes[p] as number) * (source[i] as number) - ny * (source[i + 1] as number);
      if (inside < depth) depth = inside;
    }
    if (depth > out.depth) out.depth = depth;
  }
}

/** One half-plane: from `source` to `target`; gives the count of corners kept. */
function cut(count: number, nx: number, ny: number, c: number): number {
  let kept = 0;
  let previous = 3 * (count - 1);
  let offPrevious = nx * (source[previous] as number) + ny * (source[previous + 1] as number) - c;
  for (let i = 0; i < count; i++) {
    const here = 3 * i;
    const off = nx * (source[here] as number) + ny * (source[here + 1] as number) - c;
    if (off <= 0 !== offPrevious <= 0) {
      const share = offPrevious / (offPrevious - off);
      for (let j = 0; j < 3; j++) {
        const from = source[previous + j] as number;
        target[3 * kept + j] = from + share * ((source[here + j] as number) - from);
      }
      kept++;
    }
    if (off <= 0) {
      for (let j = 0; j < 3; j++) target[3 * kept + j] = source[here + j] as number;
      kept++;
    }
    previous = here;
    offPrevious = off;
  }
  return kept;
}
