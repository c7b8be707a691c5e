/** x, y, z of the least and of the most corner. */
export type Box = Float64Array;

export function boxInto(points: Float64Array, box: Box): void {
  let ax = Infinity;
  let ay = Infinity;
  let az = Infinity;
  let bx = -Infinity;
  let by = -Infinity;
  let bz = -Infinity;
  for (let i = 0; i < points.length; i += 3) {
    const x = points[i] as number;
    const y = points[i + 1] as number;
    const z = points[i + 2] as number;
    if (x < ax) ax = x;
    if (x > bx) bx = x;
    if (y < ay) ay = y;
    if (y > by) by = y;
    if (z < az) az = z;
    if (z > bz) bz = z;
  }
  box[0] = ax; box[1] = ay; box[2] = az; box[3] = bx; box[4] = by; box[5] = bz;
}

/** Distance of a box, lowered by `lift`, to the box round a bar: a lower bound of the distance of what is in them. */
export function boxToBar(box: Box, lift: number, bar: readonly [number, number, number, number], from: number, to: number): number {
  const dx = Math.max(0, (box[0] as number) - bar[2], bar[0] - (box[3] as number));
  const dy = Math.max(0, (box[1] as number) - lift - bar[3], bar[1] - (box[4] as number) + lift);
  const dz = Math.max(0, (box[2] as number) - to, from - (box[5] as number));
  return Math.sqrt(dx * dx + dy * dy + dz * dz);
}

export function boxesMeet(p: Box, q: Box): boolean {
  for (let k = 0; k < 3; k++) if ((p[k] as number) > (q[k + 3] as number) || (q[k] as number) > (p[k + 3] as number)) return false;
  return true;
}

/** Distance of two boxes. */
export function boxDistance(p: Box, q: Box): number {
  let sum = 0;
  for (let k = 0; k < 3; k++) {
    const gap = Math.max(0, (p[k] as number) - (q[k + 3] as number), (q[k] as number) - (p[k + 3] as number));
    sum += gap * gap;
  }
  return Math.sqrt(sum);
}
