import type { Bounds } from "./half";
import type { PlacedShape } from "./placedShape";

/** How far a box of a wing (a, b), posed by the five numbers at `at` of `poses`, surely stands off the box round a shape that stands `lift` higher; below 0 when the two boxes overlap. */
export function boxGap(poses: Float64Array, at: number, { a, b }: Pick<Bounds, "a" | "b">, box: PlacedShape["box"], lift: number): number {
  const sin = poses[at] as number;
  const cos = poses[at + 1] as number;
  const x = poses[at + 2] as number;
  const y = (poses[at + 3] as number) - lift;
  const [ax0, ax1] = cos >= 0 ? [a[0] * cos, a[1] * cos] : [a[1] * cos, a[0] * cos];
  const [ay0, ay1] = sin >= 0 ? [a[0] * sin, a[1] * sin] : [a[1] * sin, a[0] * sin];
  const [bx0, bx1] = sin >= 0 ? [-b[1] * sin, -b[0] * sin] : [-b[0] * sin, -b[1] * sin];
  const [by0, by1] = cos >= 0 ? [b[0] * cos, b[1] * cos] : [b[1] * cos, b[0] * cos];
  return Math.max(box[0] - (x + ax1 + bx1), x + ax0 + bx0 - box[1], box[2] - (y + ay1 + by1), y + ay0 + by0 - box[3]);
}
