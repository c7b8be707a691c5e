import type { DrawnFace } from "./drawnFace";
import { outlineAsChords } from "./outlineAsChords";
import { outlineCircles } from "./outlineCircles";
import type { BaseShape, DimensionKind } from "./partDocument";

export function drawnBase(base: BaseShape, dimension: DimensionKind): DrawnFace {
  const { points, firstPoint } = outlineAsChords(base.outline);
  const corner = (k: number) => points[firstPoint[k % firstPoint.length] ?? 0] ?? [0, 0];
  return { points, edges: firstPoint.map((_, k) => ({ from: corner(k), to: corner(k + 1) })), dimension, chainEdge: null, circles: outlineCircles(base.outline) };
}
