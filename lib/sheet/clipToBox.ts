import type { Vec2 } from "@/bending/geometry/vec2";

/** Left, top, right, bottom in the drawing (y downwards). */
export type Bounds = readonly [number, number, number, number];

/** The part of a closed polygon that lies in a box (Sutherland-Hodgman); cut edges run along the box. */
export function clipToBox(points: readonly Vec2[], [left, top, right, bottom]: Bounds): readonly Vec2[] {
  const sides: readonly ((point: Vec2) => number)[] = [
    (p) => p[0] - left, (p) => right - p[0], (p) => p[1] - top, (p) => bottom - p[1],
  ];
  return sides.reduce<readonly Vec2[]>((polygon, inside) => clipAt(polygon, inside), points);
}

function clipAt(polygon: readonly Vec2[], inside: (point: Vec2) => number): readonly Vec2[] {
  return polygon.flatMap((to, i) => {
    const from = polygon[(i + polygon.length - 1) % polygon.length] ?? to;
    const [a, b] = [inside(from), inside(to)];
    const crossing: Vec2[] = a < 0 !== b < 0 ? [[from[0] + ((to[0] - from[0]) * a) / (a - b), from[1] + ((to[1] - from[1]) * a) / (a - b)]] : [];
    return b < 0 ? crossing : [...crossing, to];
  });
}
