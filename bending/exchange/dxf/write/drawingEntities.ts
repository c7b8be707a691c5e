import type { Vec2 } from "../../../geometry/vec2";
import type { FlatContour } from "../../../part/partModel";
import type { DrawnBendLine, FlatDrawing } from "../../flatDrawing";
import { BEND_DATA_NAME } from "../read/readBendData";
import type { Handles } from "./createHandles";
import { etchMarks } from "./etchMarks";
import type { Tag } from "./writeTags";

export interface DrawingMarks {
  /** Short lines on the sheet at both ends of each bend line, to find it again when the sheet is cut. */
  readonly bendTicks: boolean;
  /** A text on the base, e.g. the part's number. */
  readonly text: string | null;
}

/** The entities of a flat: contours on CUT, bend lines on BEND_UP and BEND_DOWN, marks on ETCH. `scale`: drawing units in a mm. */
export function drawingEntities(drawing: FlatDrawing, marks: DrawingMarks, scale: number, owner: string, handles: Handles): readonly Tag[] {
  const head = (kind: string, layer: string, marker: string): readonly Tag[] => [[0, kind], [5, handles.next()], [330, owner], [100, "AcDbEntity"], [8, layer], [100, marker]];
  const point = (code: number, [x, y]: Vec2): readonly Tag[] => [[code, x * scale], [code + 10, y * scale], [code + 20, 0]];
  const line = (layer: string, [a, b]: readonly [Vec2, Vec2]): readonly Tag[] => [...head("LINE", layer, "AcDbLine"), ...point(10, a), ...point(11, b)];
  const contour = (one: FlatContour): readonly Tag[] => one.kind === "circle"
    ? [...head("CIRCLE", "CUT", "AcDbCircle"), ...point(10, one.centre), [40, one.radius * scale]]
    : [...head("LWPOLYLINE", "CUT", "AcDbPolyline"), [90, one.vertices.length], [70, 1],
      ...one.vertices.flatMap(([x, y, bulge]): readonly Tag[] => [[10, x * scale], [20, y * scale], ...(bulge === 0 ? [] : [[42, bulge] as const])])];
  const bendData = ({ id, direction, hem, angle, insideRadius, k }: DrawnBendLine): readonly Tag[] => [
    [1001, BEND_DATA_NAME], [1000, id], [1000, direction], [1000, hem ?? ""], [1040, angle], [1040, insideRadius], [1040, k],
  ];
  const etched = etchMarks(drawing, marks);
  return [
    ...[drawing.contours.outline, ...drawing.contours.holes].flatMap(contour),
    ...drawing.bendLines.flatMap((bend) => [...line(bend.direction === "up" ? "BEND_UP" : "BEND_DOWN", bend.line), ...bendData(bend)]),
    ...etched.lines.flatMap((one) => line("ETCH", one)),
    ...(etched.text ? [...head("TEXT", "ETCH", "AcDbText"), ...point(10, etched.text.at), [40, etched.text.height * scale] as const, [1, etched.text.says] as const, [100, "AcDbText"] as const] : []),
  ];
}
