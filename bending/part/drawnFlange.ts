import type { Vec2 } from "../geometry/vec2";
import type { DrawnFace } from "./drawnFace";
import type { SideLine } from "./mitreLines";
import { outlineAsChords } from "./outlineAsChords";
import { outlineCircles } from "./outlineCircles";
import type { DimensionKind, DocumentVertex } from "./partDocument";

export interface FlangeDrawing {
  /** Plane length, from the end of the bend to the far edge as drawn. */
  readonly reach: number;
  /** Outside setback of the flange's own bend. */
  readonly setback: number;
  /** The sides, along the bend from the flange's start. */
  readonly start: SideLine;
  readonly end: SideLine;
  readonly dimension: DimensionKind;
}

/** A flange given by its length: a trapezoid whose sides lean from where the bend ends. Null when they meet before the far edge. */
export function drawnFlange({ reach, setback, start, end, dimension }: FlangeDrawing): DrawnFace | null {
  const at = (side: SideLine, distance: number) => side.at + distance * side.lean;
  if (at(end, reach) - at(start, reach) <= 0 || end.at - start.at <= 0) return null;
  return drawnFromOwnOutline([
    [at(start, -setback), 0], [at(end, -setback), 0], [at(end, reach), setback + reach], [at(start, reach), setback + reach],
  ], dimension, 2);
}

/** A flange's outline in its own plane (second axis away from the bend) seen from the base's top instead. */
export function drawnFromOwnOutline(outline: readonly DocumentVertex[], dimension: DimensionKind, chainEdge: number | null = null): DrawnFace {
  const { points, firstPoint } = outlineAsChords(outline);
  const local = points.map(([a, b]): Vec2 => [a, -b]);
  const corner = (k: number) => local[firstPoint[k % firstPoint.length] ?? 0] ?? [0, 0];
  return {
    points: [...local].reverse(),
    edges: firstPoint.map((_, k) => ({ from: corner(k + 1), to: corner(k) })),
    dimension,
    chainEdge,
    circles: outlineCircles(outline).map(({ centre, radius }) => ({ centre: [centre[0], -centre[1]], radius })),
  };
}
