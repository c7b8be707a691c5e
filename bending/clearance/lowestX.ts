import type { Mm } from "../core/units";
import type { Bend } from "../part/partModel";
import type { Bounds } from "./half";

/**
 * How near the middle plane x = 0 anything within the bounds comes while the bend is formed to `to` (half the angle): below 0
 * when it may pass over. A corner stands at A/2 sin h / h + a cos h + ((1 - k) t - b) sin h (see `wingPose`); the first term
 * falls with h, the rest is a sine curve, whose least is at an end or at its trough.
 */
export function lowestX(bend: Bend, thickness: Mm, { a, b }: Bounds, to: number): number {
  const [cos, sin] = [a[0], (1 - bend.k) * thickness - b[1]];
  const neutral = (bend.allowance / 2) * (to < 1e-9 ? 1 : Math.sin(to) / to);
  const trough = Math.atan2(-sin, -cos);
  if (trough > 0 && trough < to) return neutral - Math.hypot(cos, sin);
  return neutral + Math.min(cos, cos * Math.cos(to) + sin * Math.sin(to));
}
