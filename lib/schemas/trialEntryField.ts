import type { TrialEntry } from "./bendTrialOf";

const fields: Readonly<Record<string, keyof TrialEntry>> = {
  nominalThickness: "nominal",
  blankLength: "blank",
  "flanges[0]": "flangeA",
  "flanges[1]": "flangeB",
  "instruments.length": "lengthInstrument",
  "instruments.thickness": "thicknessInstrument",
  "instruments.angle": "angleInstrument",
  "instruments.radius": "radiusInstrument",
};

/** The field of a notebook line that a problem of its trial is about. */
export const trialEntryField = (path: string): string => fields[path] ?? path;
