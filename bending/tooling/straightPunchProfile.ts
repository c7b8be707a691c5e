import type { Mm, Rad } from "../core/units";
import type { ProfilePoint } from "../geometry/vec2";
import { arcPoints } from "./arcPoints";

export interface StraightPunchShape {
  readonly tipAngle: Rad;
  readonly tipRadius: Mm;
  /** Seat to tip. */
  readonly height: Mm;
  readonly bodyWidth: Mm;
}

/** A punch alike on both sides: rounded tip, flanks at the tip angle up to the body's width, then straight up. Counter-clockwise from the tip. */
export function straightPunchProfile(shape: StraightPunchShape): readonly ProfilePoint[] {
  const half = shape.tipAngle / 2;
  const side = shape.bodyWidth / 2;
  const back = arcPoints([0, shape.tipRadius], shape.tipRadius, -Math.PI / 2, -half);
  const tangent = back[back.length - 1] ?? [0, 0];
  const flankTop = tangent[1] + (side - tangent[0]) / Math.tan(half);
  const right: readonly ProfilePoint[] = [...back, [side, flankTop], [side, shape.height]];
  const left = right.slice(1).map(([x, y]): ProfilePoint => [-x, y]).reverse();
  return [[0, 0], ...right.slice(1), ...left];
}
