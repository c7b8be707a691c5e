import type { Pose } from "./pose";

export interface Handling {
  readonly flip: boolean;
  /** Degrees turned about the vertical, 0..180. */
  readonly turn: number;
}

/** Degrees. Two headings nearer than this are the same: far under what a person sees. */
const SAME_HEADING_DEG = 0.01;

/**
 * What the operator does between two strokes. Turned over, the sheet may go about either level axis, so a
 * heading and its opposite are the same then and the turn is at most 90 degrees. Common practice, no source.
 */
export function handlingBetween(from: Pose | null, to: Pose): Handling {
  if (from === null) return { flip: false, turn: 0 };
  const flip = from.up !== to.up;
  const circle = flip ? 180 : 360;
  const raw = (((to.heading - from.heading) * 180) / Math.PI) % circle;
  const positive = raw < 0 ? raw + circle : raw;
  const turn = Math.min(positive, circle - positive);
  return { flip, turn: turn < SAME_HEADING_DEG ? 0 : turn };
}
