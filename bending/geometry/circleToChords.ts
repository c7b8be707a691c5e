import type { Vec2 } from "./vec2";

/** A circle as a counter-clockwise polygon whose chords stand no farther than `tolerance` off it. */
export function circleToChords(centre: Vec2, radius: number, tolerance: number): readonly Vec2[] {
  const step = 2 * Math.acos(Math.max(0, 1 - tolerance / radius));
  const count = Math.min(720, 4 * Math.max(3, Math.ceil(Math.PI / (2 * Math.max(step, 1e-9)))));
  return Array.from({ length: count }, (_, i): Vec2 => {
    const a = (2 * Math.PI * i) / count;
    return [centre[0] + radius * Math.cos(a), centre[1] + radius * Math.sin(a)];
  });
}
