import type { Vec2 } from "@/bending/geometry/vec2";

/** How a drawing in millimetres (y up) is put on a sheet of `width` x `height` drawing units (y down). */
export interface View {
  readonly width: number;
  readonly height: number;
  /** Drawing units in one millimetre. */
  readonly scale: number;
  readonly at: (point: Vec2) => Vec2;
}

interface FitOptions {
  readonly width: number;
  readonly maxHeight: number;
  readonly minHeight?: number;
  /** Room for dimensions: left, top, right, bottom. */
  readonly margin: readonly [number, number, number, number];
}

/** Fits what the points span into the sheet, as large as it goes, in the middle. */
export function fitView(points: readonly Vec2[], { width, maxHeight, minHeight = 0, margin }: FitOptions): View {
  const xs = points.map((point) => point[0]);
  const ys = points.map((point) => point[1]);
  const [left, right] = points.length === 0 ? [0, 1] : [Math.min(...xs), Math.max(...xs)];
  const [low, high] = points.length === 0 ? [0, 1] : [Math.min(...ys), Math.max(...ys)];
  const spanX = Math.max(right - left, 1e-6);
  const spanY = Math.max(high - low, 1e-6);
  const roomX = width - margin[0] - margin[2];
  const scale = Math.min(roomX / spanX, (maxHeight - margin[1] - margin[3]) / spanY);
  const height = Math.max(minHeight, spanY * scale + margin[1] + margin[3]);
  const x0 = margin[0] + (roomX - spanX * scale) / 2;
  const y0 = margin[1] + (height - margin[1] - margin[3] - spanY * scale) / 2;
  return { width, height, scale, at: ([x, y]) => [x0 + (x - left) * scale, y0 + (high - y) * scale] };
}
