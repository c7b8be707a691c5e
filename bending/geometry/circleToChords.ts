import type { Vec2 } from "./vec2";

/**
 * A circle as a counter-clockwise polygon of the same area that stands no farther than `tolerance` off it:
 * its corners lie a little outside, the middles of its sides a little inside.
 */
export function circleToChords(centre: Vec2, radius: number, tolerance: number): readonly Vec2[] {
  const step = 2 * Math.acos(Math.max(0, 1 - tolerance / radius));
  const count = Math.min(720, 4 * Math.max(3, Math.ceil(Math.PI / (2 * Math.max(step, 1e-9)))));
  const outside = radius * Math.sqrt(Math.PI / (count * Math.sin(Math.PI / count) * Math.cos(Math.PI / count)));
  return Array.from({ length: count }, (_, i): Vec2 => {
    const a = (2 * Math.PI * i) / count;
    return [centre[0] + outside * Math.cos(a), centre[1] + outside * Math.sin(a)];
  });
}
