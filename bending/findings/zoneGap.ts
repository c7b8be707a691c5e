import type { Vec2 } from "../geometry/vec2";
import { bendDirections } from "../part/bendDirections";
import type { Bend } from "../part/partModel";

export interface ZoneGap {
  /** Least distance from the outline to the zone; 0 when it reaches into it. */
  readonly gap: number;
  /** How far the outline reaches into the zone and beyond, from the zone's border on its own side; 0 when it stays clear. */
  readonly into: number;
  /** Unit vector across the bend line, from the zone to the outline. */
  readonly away: Vec2;
  /** The nearest points: on the zone's border and on the outline. */
  readonly from: Vec2;
  readonly to: Vec2;
}

/** How near an outline comes to a bend zone, measured in the sheet (mm). A zone counts as the rectangle round its four corners. */
export function zoneGap(outline: readonly Vec2[], bend: Bend): ZoneGap {
  const { along: d, outward: n } = bendDirections(bend);
  const [[ox, oy]] = bend.line;
  const local = outline.map(([x, y]): Vec2 => [(x - ox) * d[0] + (y - oy) * d[1], (x - ox) * n[0] + (y - oy) * n[1]]);
  const corners = bend.zone.map(([x, y]) => (x - ox) * d[0] + (y - oy) * d[1]);
  const [start, end] = [Math.min(...corners), Math.max(...corners)];
  const half = bend.allowance / 2;
  const middle = local.reduce((sum, [, h]) => sum + h, 0) / Math.max(local.length, 1);
  const side = middle >= 0 ? 1 : -1;
  let best = { gap: Infinity, at: [0, 0] as Vec2, on: [0, 0] as Vec2 };
  let into = 0;
  local.forEach((p, i) => {
    const q = local[(i + 1) % local.length] ?? p;
    for (const point of nearestOnSegment(p, q, start, end, half)) {
      const on: Vec2 = [clamp(point[0], start, end), clamp(point[1], -half, half)];
      const gap = Math.hypot(point[0] - on[0], point[1] - on[1]);
      if (gap < best.gap) best = { gap, at: point, on };
      if (point[0] > start && point[0] < end) into = Math.max(into, half - side * point[1]);
    }
  });
  const back = ([a, h]: Vec2): Vec2 => [ox + d[0] * a + n[0] * h, oy + d[1] * a + n[1] * h];
  return { gap: best.gap, into, away: [n[0] * side, n[1] * side], from: back(best.on), to: back(best.at) };
}

/** Points of a segment among which the one nearest to an upright rectangle is: its ends, and where it passes the rectangle's corners and sides. */
function nearestOnSegment(p: Vec2, q: Vec2, start: number, end: number, half: number): readonly Vec2[] {
  const [dx, dy] = [q[0] - p[0], q[1] - p[1]];
  const square = dx * dx + dy * dy;
  const at = (t: number): Vec2 => [p[0] + dx * t, p[1] + dy * t];
  const shares = [0, 1];
  for (const corner of [start, end]) {
    if (dx !== 0) shares.push((corner - p[0]) / dx);
    for (const h of [-half, half]) if (square > 0) shares.push(((corner - p[0]) * dx + (h - p[1]) * dy) / square);
  }
  if (dy !== 0) shares.push((-half - p[1]) / dy, (half - p[1]) / dy);
  return shares.filter((t) => t >= 0 && t <= 1).map(at);
}

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));
