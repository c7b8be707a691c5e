import type { LineField } from "./trialDraft";

/** What the fields are called, on screen and in messages. */
export const fieldWords: Readonly<Record<LineField, string>> = {
  material: "Material",
  batch: "Batch",
  nominal: "Nominal",
  thickness: "Thickness",
  vOpening: "V opening",
  punchRadius: "Punch radius",
  angle: "Angle",
  blank: "Blank",
  flangeA: "Flange 1",
  flangeB: "Flange 2",
  insideRadius: "Inside radius",
  note: "Note",
};
