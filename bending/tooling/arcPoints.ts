import type { ProfilePoint } from "../geometry/vec2";
import { ARC_CHORD_MM } from "../core/tolerance";

/**
 * Points on a circle from angle `from` to angle `to` (radians, ends included, turning either way): its chords stand
 * off the arc by at most `ARC_CHORD_MM`, on the side of the centre.
 */
export function arcPoints(centre: ProfilePoint, radius: number, from: number, to: number): readonly ProfilePoint[] {
  if (radius <= 0) return [centre];
  const step = 2 * Math.acos(Math.max(0, 1 - ARC_CHORD_MM / radius));
  const count = Math.max(1, Math.ceil(Math.abs(to - from) / step));
  return Array.from({ length: count + 1 }, (_, i): ProfilePoint => {
    const angle = from + ((to - from) * i) / count;
    return [centre[0] + radius * Math.cos(angle), centre[1] + radius * Math.sin(angle)];
  });
}
