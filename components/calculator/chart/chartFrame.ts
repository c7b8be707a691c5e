import type { Vec2 } from "@/bending/geometry/vec2";

/** Size of letters on a chart, in drawing units of a sheet 820 wide. */
export const TEXT = 17;

export interface ChartFrame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** What the axes span. */
  readonly x: readonly [number, number];
  readonly y: readonly [number, number];
  /** Where a point of the axes lies on the sheet. */
  readonly at: (point: readonly [number, number]) => Vec2;
}

/** The plot's place on its sheet; points outside the axes land outside the plot. */
export function chartFrame(x: readonly [number, number], y: readonly [number, number]): ChartFrame {
  const [width, height, left, right, top, bottom] = [820, 470, 74, 22, 44, 58];
  const [spanX, spanY] = [Math.max(x[1] - x[0], 1e-9), Math.max(y[1] - y[0], 1e-9)];
  return {
    width, height, left, right, top, bottom, x, y,
    at: ([px, py]) => [left + ((px - x[0]) / spanX) * (width - left - right), height - bottom - ((py - y[0]) / spanY) * (height - top - bottom)],
  };
}
