/** Corners that one side of a prism can have. */
const MOST = 4096;
const pNormals = new Float64Array(3 * (MOST + 1));
const qNormals = new Float64Array(3 * (MOST + 1));
const pEdges = new Float64Array(3 * (MOST + 2));
const qEdges = new Float64Array(3 * (MOST + 2));

/**
 * How far two placed prisms (x, y, z a corner; `count` on one side, then `count` on the other) stand apart, by separating
 * axes: their sides' normals and the cross products of their edges. Never more than the true distance; below 0 the depth of
 * the overlap. Ends early, with any lower bound, once the gap is `enough`.
 */
export function prismGap(p: Float64Array, pCount: number, q: Float64Array, qCount: number, enough: number): number {
  let widest = Math.max(gapAlong(p, q, 1, 0, 0), gapAlong(p, q, 0, 1, 0), gapAlong(p, q, 0, 0, 1));
  if (widest >= enough) return widest;
  writeNormals(p, pCount, pNormals);
  widest = alongAll(p, q, pNormals, pCount + 1, widest, enough);
  if (widest >= enough) return widest;
  writeNormals(q, qCount, qNormals);
  widest = alongAll(p, q, qNormals, qCount + 1, widest, enough);
  if (widest >= enough) return widest;
  writeEdges(p, pCount, pEdges);
  writeEdges(q, qCount, qEdges);
  for (let i = 0; i < 3 * (pCount + 2); i += 3) {
    const [ax, ay, az] = [pEdges[i] as number, pEdges[i + 1] as number, pEdges[i + 2] as number];
    for (let j = 0; j < 3 * (qCount + 2); j += 3) {
      const [bx, by, bz] = [qEdges[j] as number, qEdges[j + 1] as number, qEdges[j + 2] as number];
      const [x, y, z] = [ay * bz - az * by, az * bx - ax * bz, ax * by - ay * bx];
      const square = x * x + y * y + z * z;
      if (square <= 1e-18 || square <= 1e-8 * (ax * ax + ay * ay + az * az) * (bx * bx + by * by + bz * bz)) continue;
      const length = Math.sqrt(square);
      widest = Math.max(widest, gapAlong(p, q, x / length, y / length, z / length));
      if (widest >= enough) return widest;
    }
  }
  return widest;
}

function alongAll(p: Float64Array, q: Float64Array, axes: Float64Array, count: number, before: number, enough: number): number {
  let widest = before;
  for (let i = 0; i < 3 * count && widest < enough; i += 3) {
    const [x, y, z] = [axes[i] as number, axes[i + 1] as number, axes[i + 2] as number];
    const length = Math.sqrt(x * x + y * y + z * z);
    if (length > 1e-9) widest = Math.max(widest, gapAlong(p, q, x / length, y / length, z / length));
  }
  return widest;
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
function writeEdges(p: Float64Array, count: number, out: Float64Array): void {
  for (let i = 0; i < count; i++) writeEdge(p, i, (i + 1) % count, out, i);
  writeEdge(p, 0, count, out, count);
  writeEdge(p, 1, count + 1, out, count + 1);
}

function writeEdge(p: Float64Array, from: number, to: number, out: Float64Array, at: number): void {
  for (let j = 0; j < 3; j++) out[3 * at + j] = (p[3 * to + j] as number) - (p[3 * from + j] as number);
}

/** The normal of one side, then those of the sides round it. */
function writeNormals(p: Float64Array, count: number, out: Float64Array): void {
  writeNormal(p, 0, 1, count - 1, out, 0);
  for (let i = 0; i < count; i++) writeNormal(p, i, (i + 1) % count, count + i, out, i + 1);
}

function writeNormal(p: Float64Array, o: number, a: number, b: number, out: Float64Array, at: number): void {
  const [ox, oy, oz] = [p[3 * o] as number, p[3 * o + 1] as number, p[3 * o + 2] as number];
  const [ax, ay, az] = [(p[3 * a] as number) - ox, (p[3 * a + 1] as number) - oy, (p[3 * a + 2] as number) - oz];
  const [bx, by, bz] = [(p[3 * b] as number) - ox, (p[3 * b + 1] as number) - oy, (p[3 * b + 2] as number) - oz];
  out[3 * at] = ay * bz - az * by;
  out[3 * at + 1] = az * bx - ax * bz;
  out[3 * at + 2] = ax * by - ay * bx;
}
