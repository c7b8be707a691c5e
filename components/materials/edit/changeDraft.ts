import type { MaterialField } from "@/bending/handbook/material";
import type { MaterialDraft } from "./materialDraft";

/** What is typed for each value. */
export const draftKeys: Readonly<Record<MaterialField, readonly (keyof MaterialDraft)[]>> = {
  tensile: ["tensileLow", "tensileHigh"], yield: ["yield"], modulus: ["modulus"], density: ["density"], straightLengthGroup: ["straightLengthGroup"],
  naturalRadiusRatio: ["naturalRadiusRatio"], defaultRadiusPerThickness: ["defaultRadiusPerThickness"], allowance: ["rule", "k"], minimumRadii: ["radiiAs", "radii"], springbackRow: ["springbackRow"],
};

/**
 * Changes one value of a draft. A changed value is no longer from where the old one was: its source becomes the shop, to be
 * said; put back as it was, its source comes back too. Without a `base` (a new material) sources stay as typed.
 */
export function changeDraft(draft: MaterialDraft, field: MaterialField, change: Partial<MaterialDraft>, base: MaterialDraft | null): MaterialDraft {
  const next = { ...draft, ...change };
  if (base === null) return next;
  const [origin, first] = [draft.origins[field], base.origins[field]];
  const isBase = draftKeys[field].every((key) => JSON.stringify(next[key]) === JSON.stringify(base[key]));
  const untouched = origin.kind === first.kind && origin.text === first.text;
  const blank = origin.text === "";
  if (isBase) return blank ? { ...next, origins: { ...draft.origins, [field]: first } } : next;
  return untouched ? { ...next, origins: { ...draft.origins, [field]: { kind: "shop", text: "" } } } : next;
}
