import type { Vec2 } from "../geometry/vec2";
import type { DrawnFace } from "./drawnFace";
import { outlineAsChords } from "./outlineAsChords";
import { outlineCircles } from "./outlineCircles";
import type { DimensionKind, DocumentVertex } from "./partDocument";

export interface FlangeDrawing {
  readonly width: number;
  /** Plane length, from the end of the bend to the far edge as drawn. */
  readonly reach: number;
  /** Outside setback of the flange's own bend. */
  readonly setback: number;
  readonly startAngle: number;
  readonly endAngle: number;
  readonly dimension: DimensionKind;
}

/** A flange given by its length: a trapezoid whose sides lean from where the bend ends. Null when they meet before the far edge. */
export function drawnFlange({ width, reach, setback, startAngle, endAngle, dimension }: FlangeDrawing): DrawnFace | null {
  const lean = (degrees: number) => (degrees === 90 ? 0 : 1 / Math.tan((degrees * Math.PI) / 180));
  const start = (distance: number) => distance * lean(startAngle);
  const end = (distance: number) => width - distance * lean(endAngle);
  if (end(reach) - start(reach) <= 0) return null;
  return drawnFromOwnOutline([
    [start(-setback), 0], [end(-setback), 0], [end(reach), setback + reach], [start(reach), setback + reach],
  ], dimension);
}

/** A flange's outline in its own plane (second axis away from the bend) seen from the base's top instead. */
export function drawnFromOwnOutline(outline: readonly DocumentVertex[], dimension: DimensionKind): DrawnFace {
  const { points, firstPoint } = outlineAsChords(outline);
  const local = points.map(([a, b]): Vec2 => [a, -b]);
  const corner = (k: number) => local[firstPoint[k % firstPoint.length] ?? 0] ?? [0, 0];
  return {
    points: [...local].reverse(),
    edges: firstPoint.map((_, k) => ({ from: corner(k + 1), to: corner(k) })),
    dimension,
    circles: outlineCircles(outline).map(({ centre, radius }) => ({ centre: [centre[0], -centre[1]], radius })),
  };
}
