import { polygonBounds } from "../../../geometry/polygonBounds";
import { mmPer, type LengthUnit } from "../../../core/units";
import { contourAsChords } from "../../../part/contourAsChords";
import type { FlatDrawing } from "../../flatDrawing";
import { BEND_DATA_NAME } from "../read/readBendData";
import { createHandles } from "./createHandles";
import { drawingEntities, type DrawingMarks } from "./drawingEntities";
import { DXF_LAYERS, DXF_LINE_TYPES } from "./dxfLayers";
import { writeTags, type Tag } from "./writeTags";

/** Handles of the file's frame. */
const AT = { blocks: "1", layers: "2", styles: "3", lineTypes: "5", views: "6", ucs: "7", viewports: "8", applications: "9", dimensions: "A", root: "C", groups: "D", model: "1F", paper: "1B", modelBlock: "20", modelEnd: "21", paperBlock: "1C", paperEnd: "1D" } as const;

/**
 * A flat as DXF, version AC1015 (R2000), ASCII: `CUT` closed contours with arcs as arcs, `BEND_UP` and `BEND_DOWN` bend lines, `ETCH`
 * marks. Structure by the published DXF reference: every table that a reader may ask for is there, with handles and owners.
 */
export function writeDxf(drawing: FlatDrawing, units: LengthUnit, marks: DrawingMarks = { bendTicks: false, text: null }): string {
  const scale = 1 / mmPer(units);
  const handles = createHandles();
  const { min, max } = polygonBounds(contourAsChords(drawing.contours.outline));
  const entities = drawingEntities(drawing, marks, scale, AT.model, handles);
  const layers = DXF_LAYERS.map(({ name, colour, lineType }): readonly Tag[] => [...record("LAYER", handles.next(), AT.layers, "AcDbLayerTableRecord", name), [70, 0], [62, colour], [6, lineType]]);
  const lineTypes = DXF_LINE_TYPES.map(({ name, says, dashes }): readonly Tag[] => [
    ...record("LTYPE", handles.next(), AT.lineTypes, "AcDbLinetypeTableRecord", name), [70, 0], [3, says], [72, 65], [73, dashes.length],
    [40, dashes.reduce((sum: number, dash) => sum + Math.abs(dash), 0) * scale], ...dashes.flatMap((dash): readonly Tag[] => [[49, dash * scale], [74, 0]]),
  ]);
  const style: readonly Tag[] = [...record("STYLE", handles.next(), AT.styles, "AcDbTextStyleTableRecord", "Standard"), [70, 0], [40, 0], [41, 1], [50, 0], [71, 0], [42, 2.5], [3, "txt"], [4, ""]];
  const applications = ["ACAD", BEND_DATA_NAME].map((name): readonly Tag[] => [...record("APPID", handles.next(), AT.applications, "AcDbRegAppTableRecord", name), [70, 0]]);
  const viewport: readonly Tag[] = [
    ...record("VPORT", handles.next(), AT.viewports, "AcDbViewportTableRecord", "*Active"), [70, 0], [10, 0], [20, 0], [11, 1], [21, 1],
    [12, ((min[0] + max[0]) / 2) * scale], [22, ((min[1] + max[1]) / 2) * scale], [13, 0], [23, 0], [14, 10], [24, 10], [15, 10], [25, 10], [16, 0], [26, 0], [36, 1], [17, 0], [27, 0], [37, 0],
    [40, Math.max(max[1] - min[1], (max[0] - min[0]) / 1.5) * scale * 1.1], [41, 1.5], [42, 50], [43, 0], [44, 0], [50, 0], [51, 0], [71, 0], [72, 100], [73, 1], [74, 3], [75, 0], [76, 0], [77, 0], [78, 0],
  ];
  const blockRecords = ([["*Model_Space", AT.model], ["*Paper_Space", AT.paper]] as const).map(([name, handle]): readonly Tag[] => [...record("BLOCK_RECORD", handle, AT.blocks, "AcDbBlockTableRecord", name), [340, "0"]]);
  return writeTags([
    ...section("HEADER", [
      ...variable("$ACADVER", [1, "AC1015"]), ...variable("$DWGCODEPAGE", [3, "ANSI_1252"]),
      ...variable("$EXTMIN", [10, min[0] * scale], [20, min[1] * scale], [30, 0]), ...variable("$EXTMAX", [10, max[0] * scale], [20, max[1] * scale], [30, 0]),
      ...variable("$INSUNITS", [70, units === "in" ? 1 : 4]), ...variable("$MEASUREMENT", [70, units === "in" ? 0 : 1]), ...variable("$LUNITS", [70, 2]),
      ...variable("$HANDSEED", [5, handles.seed()]),
    ]),
    ...section("CLASSES", []),
    ...section("TABLES", [
      ...table("VPORT", AT.viewports, [viewport]), ...table("LTYPE", AT.lineTypes, lineTypes), ...table("LAYER", AT.layers, layers), ...table("STYLE", AT.styles, [style]),
      ...table("VIEW", AT.views, []), ...table("UCS", AT.ucs, []), ...table("APPID", AT.applications, applications),
      ...table("DIMSTYLE", AT.dimensions, [], [[100, "AcDbDimStyleTable"], [71, 0]]), ...table("BLOCK_RECORD", AT.blocks, blockRecords),
    ]),
    ...section("BLOCKS", [...block("*Model_Space", AT.model, AT.modelBlock, AT.modelEnd), ...block("*Paper_Space", AT.paper, AT.paperBlock, AT.paperEnd)]),
    ...section("ENTITIES", entities),
    ...section("OBJECTS", [
      [0, "DICTIONARY"], [5, AT.root], [330, "0"], [100, "AcDbDictionary"], [281, 1], [3, "ACAD_GROUP"], [350, AT.groups],
      [0, "DICTIONARY"], [5, AT.groups], [330, AT.root], [100, "AcDbDictionary"], [281, 1],
    ]),
    [0, "EOF"],
  ]);
}

const section = (name: string, tags: readonly Tag[]): readonly Tag[] => [[0, "SECTION"], [2, name], ...tags, [0, "ENDSEC"]];
const variable = (name: string, ...tags: readonly Tag[]): readonly Tag[] => [[9, name], ...tags];
const table = (name: string, handle: string, entries: readonly (readonly Tag[])[], more: readonly Tag[] = []): readonly Tag[] =>
  [[0, "TABLE"], [2, name], [5, handle], [330, "0"], [100, "AcDbSymbolTable"], [70, entries.length], ...more, ...entries.flat(), [0, "ENDTAB"]];
const record = (kind: string, handle: string, owner: string, marker: string, name: string): readonly Tag[] =>
  [[0, kind], [5, handle], [330, owner], [100, "AcDbSymbolTableRecord"], [100, marker], [2, name]];
const block = (name: string, owner: string, begin: string, end: string): readonly Tag[] => [
  [0, "BLOCK"], [5, begin], [330, owner], [100, "AcDbEntity"], [8, "0"], [100, "AcDbBlockBegin"], [2, name], [70, 0], [10, 0], [20, 0], [30, 0], [3, name], [1, ""],
  [0, "ENDBLK"], [5, end], [330, owner], [100, "AcDbEntity"], [8, "0"], [100, "AcDbBlockEnd"],
];
