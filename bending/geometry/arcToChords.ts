import type { Vec2 } from "./vec2";

const MOST_CHORDS = 720;

/**
 * Points of a bulged edge after `from`, up to and with `to`, as chords that stand no farther than `tolerance`
 * off the arc. Bulge = tangent of a quarter of the arc's angle, positive when the arc runs
 * counter-clockwise (the convention of drawing exchange files); 0 is a straight edge.
 */
export function arcToChords(from: Vec2, to: Vec2, bulge: number, tolerance: number): readonly Vec2[] {
  const chord = Math.hypot(to[0] - from[0], to[1] - from[1]);
  if (bulge === 0 || chord === 0) return [to];
  const sweep = 4 * Math.atan(bulge);
  const radius = chord / (2 * Math.abs(Math.sin(sweep / 2)));
  const step = 2 * Math.acos(Math.max(0, 1 - tolerance / radius));
  const count = Math.min(MOST_CHORDS, Math.max(2, Math.ceil(Math.abs(sweep) / Math.max(step, 1e-9))));
  // The centre lies to the left of the chord for a counter-clockwise arc of less than half a turn.
  const toCentre = (chord / 2) / Math.tan(sweep / 2);
  const [ux, uy] = [(to[0] - from[0]) / chord, (to[1] - from[1]) / chord];
  const cx = (from[0] + to[0]) / 2 - uy * toCentre;
  const cy = (from[1] + to[1]) / 2 + ux * toCentre;
  const start = Math.atan2(from[1] - cy, from[0] - cx);
  const points: Vec2[] = [];
  for (let i = 1; i < count; i++) {
    const a = start + (sweep * i) / count;
    points.push([cx + radius * Math.cos(a), cy + radius * Math.sin(a)]);
  }
  points.push(to);
  return points;
}
