import type { LengthUnit } from "../core/units";
import type { PartModel } from "../part/partModel";
import type { DrawingMarks } from "./dxf/write/drawingEntities";
import { writeDxf } from "./dxf/write/writeDxf";
import { flatDrawing } from "./flatDrawing";
import { writeGlb } from "./glb/writeGlb";
import { writeSvg } from "./svg/writeSvg";

export const DRAWING_FORMATS = ["dxf", "svg", "glb"] as const;
export type DrawingFormat = (typeof DRAWING_FORMATS)[number];

export interface DrawnFile {
  readonly content: string | Uint8Array;
  readonly mediaType: string;
}

/** A part as a file for other programs: its flat as DXF (in `units`) or SVG (true size), the folded part as GLB (metres). */
export function drawPart(part: PartModel, format: DrawingFormat, units: LengthUnit, marks?: DrawingMarks): DrawnFile {
  switch (format) {
    case "dxf": return { content: writeDxf(flatDrawing(part), units, marks), mediaType: "image/vnd.dxf" };
    case "svg": return { content: writeSvg(flatDrawing(part)), mediaType: "image/svg+xml" };
    case "glb": return { content: writeGlb(part), mediaType: "model/gltf-binary" };
    default: return format satisfies never;
  }
}
