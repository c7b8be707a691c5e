import type { Mm, Rad } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";
import { arcPoints } from "./arcPoints";

export interface VDieShape {
  /** Between the tops of the shoulder arcs. */
  readonly vOpening: Mm;
  readonly vAngle: Rad;
  readonly shoulderRadius: Mm;
  /** Seat to top plane. */
  readonly height: Mm;
  readonly bodyWidth: Mm;
}

/** A single V: shoulder arcs that leave the top plane at +-vOpening / 2, walls tangent to them down to the root. Counter-clockwise. */
export function vDieProfile(shape: VDieShape): readonly ProfilePoint[] {
  const half = shape.vAngle / 2;
  const side = shape.bodyWidth / 2;
  const shoulder = arcPoints([shape.vOpening / 2, -shape.shoulderRadius], shape.shoulderRadius, Math.PI / 2, Math.PI - half);
  const tangent = shoulder[shoulder.length - 1] ?? [0, 0];
  const root = tangent[1] - tangent[0] / Math.tan(half);
  const right: readonly ProfilePoint[] = [[side, -shape.height], [side, 0], ...shoulder];
  const left = right.map(([x, y]): ProfilePoint => [-x, y]).reverse();
  return [...right, [0, root], ...left];
}
