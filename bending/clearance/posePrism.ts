/**
 * Turns corners of a prism (a, b, z each) into x, y, z seen from the punch's tip, written into `into`: at the back, or turned
 * by half a turn about the vertical in front. The pose is the numbers at `at` of `poses` (see `POSE_NUMBERS`).
 */
export function posePrism(points: Float64Array, poses: Float64Array, at: number, inFront: boolean, into: Float64Array): void {
  const side = inFront ? -1 : 1;
  const sin = poses[at] as number;
  const cos = poses[at + 1] as number;
  const x = poses[at + 2] as number;
  const y = poses[at + 3] as number;
  for (let i = 0; i < points.length; i += 3) {
    const a = points[i] as number;
    const b = points[i + 1] as number;
    into[i] = side * (x + a * cos - b * sin);
    into[i + 1] = y + a * sin + b * cos;
    into[i + 2] = side * (points[i + 2] as number);
  }
}
