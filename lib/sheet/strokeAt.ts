/** Shares of the slider: ram down, bending, springing back, ram up. */
const TOUCH = 0.15;
const BENT = 0.8;
const SPRUNG = 0.86;

/** mm that the ram is shown lifted when open; the real stroke is longer than a drawing wants. */
export const SHOWN_LIFT_MM = 70;

/**
 * One stroke on a slider from 0 to 1: the ram comes down, the bend goes from flat to the demanded angle, springs back to the
 * finished angle, and the ram goes up. Angles in radians turned through.
 */
export function strokeAt(at: number, demanded: number, finished: number): { readonly angle: number; readonly lift: number } {
  const share = (from: number, to: number): number => Math.min(1, Math.max(0, (at - from) / (to - from)));
  if (at <= TOUCH) return { angle: 0, lift: SHOWN_LIFT_MM * (1 - share(0, TOUCH)) };
  if (at <= BENT) return { angle: demanded * share(TOUCH, BENT), lift: 0 };
  return { angle: demanded + (finished - demanded) * share(BENT, SPRUNG), lift: SHOWN_LIFT_MM * share(SPRUNG, 1) };
}
