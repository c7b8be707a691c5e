import { clipByHalfPlane } from "../geometry/clipByHalfPlane";
import type { Frame } from "../geometry/frame";
import type { Interval } from "../geometry/interval";
import type { Vec2 } from "../geometry/vec2";

/**
 * The z-extent in which a plate (a convex piece of sheet from 0 to `thickness`, placed by `frame`) may reach
 * into a convex profile swept along z, entering it by more than `allowed`. Every side of the profile is
 * answered by the plate's own nearest surface, so the answer may be a little long but never misses: null
 * means clear.
 */
export function plateInProfile(piece: readonly Vec2[], thickness: number, frame: Frame, profile: readonly Vec2[], allowed: number): Interval | null {
  let rest: readonly Vec2[] = piece;
  for (let i = 0; i < profile.length && rest.length > 0; i += 1) {
    const [p, q] = [profile[i], profile[(i + 1) % profile.length]];
    if (!p || !q) continue;
    const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
    if (length === 0) continue;
    const [nx, ny] = [(q[1] - p[1]) / length, (p[0] - q[0]) / length];
    const limit = nx * p[0] + ny * p[1] - allowed;
    const through = thickness * (nx * frame.z[0] + ny * frame.z[1]);
    const at0 = nx * frame.o[0] + ny * frame.o[1] + Math.min(0, through);
    const slope: Vec2 = [nx * frame.x[0] + ny * frame.x[1], nx * frame.y[0] + ny * frame.y[1]];
    rest = clipBelow(rest, slope, limit - at0);
  }
  if (rest.length === 0) return null;
  const zs = rest.map((p) => frame.o[2] + frame.x[2] * p[0] + frame.y[2] * p[1]);
  const through = thickness * frame.z[2];
  return [Math.min(...zs) + Math.min(0, through), Math.max(...zs) + Math.max(0, through)];
}

/** The part of a convex polygon where slope . p < limit. */
function clipBelow(convex: readonly Vec2[], slope: Vec2, limit: number): readonly Vec2[] {
  const square = slope[0] * slope[0] + slope[1] * slope[1];
  if (square < 1e-18) return limit > 0 ? convex : [];
  return clipByHalfPlane(convex, [(slope[0] * limit) / square, (slope[1] * limit) / square], [-slope[0], -slope[1]]);
}
