import { arcToChords } from "../../../geometry/arcToChords";
import type { Vec2 } from "../../../geometry/vec2";
import { curvePieces } from "../shape/curvePieces";
import { moveCurve } from "../shape/moveCurve";
import type { PlacedShape } from "../shape/placedShape";
import { mmPerDrawingUnit, type DrawingUnit } from "./drawingUnit";
import type { LineGroup } from "./lineGroup";

/** Fine enough to look round on a screen. */
const SHOWN_MM = 0.1;

/** For each line group its lines as points, mm, to be shown; hidden groups too. */
export function drawnPaths(shapes: readonly PlacedShape[], groups: readonly LineGroup[], unit: DrawingUnit): readonly (readonly (readonly Vec2[])[])[] {
  const factor = mmPerDrawingUnit[unit];
  return groups.map((group) => group.shapes.flatMap((index) => {
    const shape = shapes[index];
    if (!shape) return [];
    const pieces = moveCurve(shape.curve, [factor, 0, 0, factor, 0, 0]).flatMap((curve) => curvePieces(curve, SHOWN_MM));
    const [first] = pieces;
    return first ? [[first.from, ...pieces.flatMap(({ from, to, bulge }) => arcToChords(from, to, bulge, SHOWN_MM))]] : [];
  }));
}
