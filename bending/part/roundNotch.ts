import { ARC_CHORD_MM } from "../core/tolerance";
import type { Vec2 } from "../geometry/vec2";

/**
 * A notch from `a` to `b` along an edge with a half-round end, `depth` deep, that begins `outside` the edge: [along, depth].
 * When it is wider than deep, its end is a flatter round that begins at the edge.
 */
export function roundNotch(a: number, b: number, depth: number, outside: number): readonly Vec2[] {
  const radius = (b - a) / 2;
  const straight = Math.max(0, depth - radius);
  const step = 2 * Math.acos(Math.max(0, 1 - ARC_CHORD_MM / radius));
  const count = Math.max(16, Math.ceil(Math.PI / step));
  const arc = Array.from({ length: count + 1 }, (_, i): Vec2 => {
    const angle = (Math.PI * i) / count;
    return [(a + b) / 2 + radius * Math.cos(angle), straight + Math.min(radius, depth) * Math.sin(angle)];
  });
  return [[a, -outside], [b, -outside], ...arc];
}
