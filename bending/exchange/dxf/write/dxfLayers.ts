/** Layers of the drawings that are written: plain names, colour index (1 red, 3 green, 5 blue, 7 as the background asks) and line type. */
export const DXF_LAYERS = [
  { name: "0", colour: 7, lineType: "Continuous" },
  { name: "CUT", colour: 7, lineType: "Continuous" },
  { name: "BEND_UP", colour: 5, lineType: "DASHDOT" },
  { name: "BEND_DOWN", colour: 1, lineType: "DASHED" },
  { name: "ETCH", colour: 3, lineType: "Continuous" },
] as const;

/** Line types by what they draw (positive) and leave out (negative), mm. */
export const DXF_LINE_TYPES = [
  { name: "ByBlock", says: "", dashes: [] },
  { name: "ByLayer", says: "", dashes: [] },
  { name: "Continuous", says: "Solid line", dashes: [] },
  { name: "DASHED", says: "Dashes", dashes: [6, -3] },
  { name: "DASHDOT", says: "Dash and dot", dashes: [8, -2, 0, -2] },
] as const;
