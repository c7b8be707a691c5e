import { polygonBounds } from "../../../geometry/polygonBounds";
import { polygonCentroid } from "../../../geometry/polygonCentroid";
import type { Vec2 } from "../../../geometry/vec2";
import { contourAsChords } from "../../../part/contourAsChords";
import type { FlatDrawing } from "../../flatDrawing";
import type { DrawingMarks } from "./drawingEntities";

/** mm. Common practice, no source: seen at arm's length, short enough to lie in most bend zones. */
const TICK_MM = 5;
const TEXT_MM = 5;
/** Width of a letter by its height, of the plain stroke font. */
const LETTER = 0.7;

export interface EtchMarks {
  readonly lines: readonly (readonly [Vec2, Vec2])[];
  readonly text: { readonly at: Vec2; readonly height: number; readonly says: string } | null;
}

/** Marks to be etched: ticks along the bend lines inwards from both ends, and a text in the middle of the sheet. */
export function etchMarks({ contours, bendLines }: FlatDrawing, marks: DrawingMarks): EtchMarks {
  const lines = !marks.bendTicks ? [] : bendLines.flatMap(({ line: [p, q] }): readonly (readonly [Vec2, Vec2])[] => {
    const length = Math.hypot(q[0] - p[0], q[1] - p[1]);
    const share = Math.min(TICK_MM, length / 3) / length;
    const toward = (a: Vec2, b: Vec2): readonly [Vec2, Vec2] => [a, [a[0] + (b[0] - a[0]) * share, a[1] + (b[1] - a[1]) * share]];
    return [toward(p, q), toward(q, p)];
  });
  const says = marks.text?.trim() ?? "";
  if (says === "") return { lines, text: null };
  const outline = contourAsChords(contours.outline);
  const { min, max } = polygonBounds(outline);
  const [x, y] = polygonCentroid(outline);
  const height = Math.min(TEXT_MM, (max[0] - min[0]) / (2 * LETTER * says.length), (max[1] - min[1]) / 4);
  return { lines, text: { at: [x - (says.length * LETTER * height) / 2, y - height / 2], height, says } };
}
