import type { Mm, Rad } from "../core/units";
import type { Bend } from "../part/partModel";
import type { Die } from "../tooling/tool";

/** Farthest that the corners of a prism lie from the tangent point of its wing. */
export interface Reach {
  readonly a: readonly [number, number];
  readonly b: readonly [number, number];
}

/**
 * Into how many equal steps a stroke is cut so that no corner travels more than `margin` in a step, seen from the punch
 * (`die` null) or from the die.
 *
 * With h half the angle, A the allowance, k and t as usual, a corner (a, b) of a wing moves, per unit of h,
 *   seen from the punch: A/2h (1 - sin h / h) + (1 - k) t - b along the wing, a + A/2h2 (1 - cos h) across it;
 *   seen from the die:   b - (1 - k) t + A/2h (tan h / h - 1) + l tan h along, a - l across it, where
 *   l = (c - (rd + R + t) sin h) / cos h is the way on the wing from its tangent to the shoulder.
 * Every term is bounded by its value at the greatest h (the first and the third grow with h; A/2h2 (1 - cos h) <= A/4).
 */
export function strokeSamples(bend: Bend, thickness: Mm, die: Die | null, reach: Reach, strokeAngle: Rad, margin: Mm): number {
  const speed = die ? fromDie(bend, thickness, die, reach, strokeAngle / 2) : fromPunch(bend, thickness, reach, strokeAngle / 2);
  return Math.max(1, Math.ceil((speed * strokeAngle) / 2 / margin));
}

function fromPunch(bend: Bend, thickness: Mm, reach: Reach, h: number): number {
  const outer = (1 - bend.k) * thickness;
  const along = (bend.allowance / (2 * h)) * (1 - Math.sin(h) / h) + farthest(reach.b, outer);
  return Math.hypot(along, farthest(reach.a, 0) + bend.allowance / 4);
}

function fromDie(bend: Bend, thickness: Mm, die: Die, reach: Reach, h: number): number {
  const outer = (1 - bend.k) * thickness;
  const tan = Math.tan(h);
  const slide = die.vOpening / 2 / Math.cos(h) + (die.shoulderRadius + outer) * tan + (bend.allowance * tan) / (2 * h);
  const along = farthest(reach.b, outer) + (bend.allowance / (2 * h)) * (tan / h - 1) + slide * tan;
  return Math.hypot(along, farthest(reach.a, 0) + slide);
}

const farthest = ([low, high]: readonly [number, number], from: number): number => Math.max(Math.abs(low - from), Math.abs(high - from));
