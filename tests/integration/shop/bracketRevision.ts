import type { NewRevision } from "@/db/parts/newRevision";
import { bracketDocument } from "./bracketDocument";

export const bracketRevision = (changes: Partial<NewRevision> = {}): NewRevision => ({
  document: bracketDocument, name: "Bracket", materialId: "S235", thicknessMm: 2, flatWidthMm: 96.52, flatDepthMm: 150, bends: 1, note: "", by: null,
  ...changes,
});
