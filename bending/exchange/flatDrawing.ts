import { flatContours, type FlatContours } from "../part/flatContours";
import type { BendDirection, HemKind } from "../part/partDocument";
import type { PartModel } from "../part/partModel";
import type { Vec2 } from "../geometry/vec2";

/** A part's flat as it is drawn for other programs: arcs exact, millimetres, degrees. */
export interface FlatDrawing {
  readonly name: string;
  readonly contours: FlatContours;
  readonly bendLines: readonly DrawnBendLine[];
}

export interface DrawnBendLine {
  readonly id: string;
  readonly line: readonly [Vec2, Vec2];
  readonly angle: number;
  readonly direction: BendDirection;
  readonly hem: HemKind | null;
  readonly insideRadius: number;
  readonly k: number;
}

/** Everything of a part's flat that a drawing shows. */
export function flatDrawing(part: PartModel): FlatDrawing {
  return {
    name: part.name,
    contours: flatContours(part),
    bendLines: part.bends.map(({ id, line, angle, direction, hem, insideRadius, k }) => ({ id, line, angle: (angle * 180) / Math.PI, direction, hem, insideRadius, k })),
  };
}
