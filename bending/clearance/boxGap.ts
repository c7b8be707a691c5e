import type { Bounds } from "./half";
import type { PlacedShape } from "./placedShape";

/** An upright box: left, right, bottom, top. */
export type Box = PlacedShape["box"];

/** The upright box round a box of a wing (a, b), posed by the numbers at `at` of `poses`, written into `into`. */
export function poseBox(poses: Float64Array, at: number, { a, b }: Pick<Bounds, "a" | "b">, into: Float64Array): void {
  const sin = poses[at] as number;
  const cos = poses[at + 1] as number;
  const x = poses[at + 2] as number;
  const y = poses[at + 3] as number;
  const [aLow, aHigh, bLow, bHigh] = [a[0], a[1], b[0], b[1]];
  into[0] = x + Math.min(aLow * cos, aHigh * cos) - Math.max(bLow * sin, bHigh * sin);
  into[1] = x + Math.max(aLow * cos, aHigh * cos) - Math.min(bLow * sin, bHigh * sin);
  into[2] = y + Math.min(aLow * sin, aHigh * sin) + Math.min(bLow * cos, bHigh * cos);
  into[3] = y + Math.max(aLow * sin, aHigh * sin) + Math.max(bLow * cos, bHigh * cos);
}

/** How far a posed box stands off another that stands `lift` higher; 0 or below when they overlap. */
export function gapOfBoxes(posed: Float64Array, box: Box, lift: number): number {
  return Math.max(box[0] - (posed[1] as number), (posed[0] as number) - box[1], box[2] + lift - (posed[3] as number), (posed[2] as number) - box[3] - lift);
}

/** How far a posed box surely stands off a shape that stands `lift` higher: off the box round it, or else off the boxes round its pieces. */
export function boxGap(posed: Float64Array, { box, pieces }: PlacedShape, lift: number): number {
  const whole = gapOfBoxes(posed, box, lift);
  if (whole > 0) return whole;
  let least = Infinity;
  for (let i = 0; i < pieces.length; i++) {
    const gap = gapOfBoxes(posed, (pieces[i] as PlacedShape["pieces"][number]).box, lift);
    if (gap <= 0) return 0;
    if (gap < least) least = gap;
  }
  return least;
}
