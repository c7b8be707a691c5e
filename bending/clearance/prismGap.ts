/**
 * How far two placed prisms (x, y, z a corner; `count` on one side, then `count` on the other) stand apart, by separating
 * axes: their sides' normals and the cross products of their edges. Never more than the true distance; below 0 the depth of
 * the overlap. Ends early, with any lower bound, once the gap is `enough`.
 */
export function prismGap(p: Float64Array, pCount: number, q: Float64Array, qCount: number, enough: number): number {
  let widest = boxGap(p, q);
  if (widest >= enough) return widest;
  const [pEdges, qEdges] = [edges(p, pCount), edges(q, qCount)];
  const test = (x: number, y: number, z: number): boolean => {
    const length = Math.hypot(x, y, z);
    if (length > 1e-9) widest = Math.max(widest, gapAlong(p, q, x / length, y / length, z / length));
    return widest >= enough;
  };
  for (const own of [normals(p, pCount), normals(q, qCount)]) {
    for (let i = 0; i < own.length; i += 3) if (test(own[i] as number, own[i + 1] as number, own[i + 2] as number)) return widest;
  }
  for (let i = 0; i < pEdges.length; i += 3) {
    const [ax, ay, az] = [pEdges[i] as number, pEdges[i + 1] as number, pEdges[i + 2] as number];
    for (let j = 0; j < qEdges.length; j += 3) {
      const [bx, by, bz] = [qEdges[j] as number, qEdges[j + 1] as number, qEdges[j + 2] as number];
      const [x, y, z] = [ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx];
      if (x * x + y * y + z * z > 1e-8 * (ax * ax + ay * ay + az * az) * (bx * bx + by * by + bz * bz) && test(x, y, z)) return widest;
    }
  }
  return widest;
}

function boxGap(p: Float64Array, q: Float64Array): number {
  return Math.max(gapAlong(p, q, 1, 0, 0), gapAlong(p, q, 0, 1, 0), gapAlong(p, q, 0, 0, 1));
}

function gapAlong(p: Float64Array, q: Float64Array, x: number, y: number, z: number): number {
  let [pLow, pHigh, qLow, qHigh] = [Infinity, -Infinity, Infinity, -Infinity];
  for (let i = 0; i < p.length; i += 3) {
    const value = x * (p[i] as number) + y * (p[i + 1] as number) + z * (p[i + 2] as number);
    if (value < pLow) pLow = value;
    if (value > pHigh) pHigh = value;
  }
  for (let i = 0; i < q.length; i += 3) {
    const value = x * (q[i] as number) + y * (q[i + 1] as number) + z * (q[i + 2] as number);
    if (value < qLow) qLow = value;
    if (value > qHigh) qHigh = value;
  }
  return Math.max(qLow - pHigh, pLow - qHigh);
}

/** Edge directions: round one side, and two across (all that a plate's or a facet's can be). */
function edges(p: Float64Array, count: number): Float64Array {
  const out = new Float64Array(3 * (count + 2));
  const put = (at: number, from: number, to: number) => {
    for (let j = 0; j < 3; j++) out[3 * at + j] = (p[3 * to + j] as number) - (p[3 * from + j] as number);
  };
  for (let i = 0; i < count; i++) put(i, i, (i + 1) % count);
  put(count, 0, count);
  put(count + 1, 1, count + 1);
  return out;
}

function normals(p: Float64Array, count: number): Float64Array {
  const out = new Float64Array(3 * (count + 1));
  const put = (at: number, o: number, a: number, b: number) => {
    const d = (i: number, j: number) => (p[3 * i + j] as number) - (p[3 * o + j] as number);
    out[3 * at] = d(a, 1) * d(b, 2) - d(a, 2) * d(b, 1);
    out[3 * at + 1] = d(a, 2) * d(b, 0) - d(a, 0) * d(b, 2);
    out[3 * at + 2] = d(a, 0) * d(b, 1) - d(a, 1) * d(b, 0);
  };
  put(0, 0, 1, count - 1);
  for (let i = 0; i < count; i++) put(i + 1, i, (i + 1) % count, count + i);
  return out;
}
