import type { MaterialField } from "@/bending/handbook/material";
import type { MaterialDraft } from "./materialDraft";

/** What is typed for each value. */
export const draftKeys: Readonly<Record<MaterialField, readonly (keyof MaterialDraft)[]>> = {
  tensile: ["tensileLow", "tensileHigh"], yield: ["yield"], modulus: ["modulus"], density: ["density"], straightLengthGroup: ["straightLengthGroup"],
  naturalRadiusRatio: ["naturalRadiusRatio"], defaultRadiusPerThickness: ["defaultRadiusPerThickness"], allowance: ["rule", "k"], minimumRadii: ["radiiAs", "radii"], springbackRow: ["springbackRow"],
};

/**
 * Changes one value of a draft. A value that is another than the draft `began` with is no longer from where that was: its source becomes
 * the shop, to be said; put back as it was, its source comes back too. A source that was never said stays to be said.
 */
export function changeDraft(draft: MaterialDraft, field: MaterialField, change: Partial<MaterialDraft>, began: MaterialDraft): MaterialDraft {
  const next = { ...draft, ...change };
  const [origin, first] = [draft.origins[field], began.origins[field]];
  if (first.text === "") return next;
  const asItWas = draftKeys[field].every((key) => JSON.stringify(next[key]) === JSON.stringify(began[key]));
  if (asItWas) return origin.text === "" ? { ...next, origins: { ...draft.origins, [field]: first } } : next;
  const untouched = origin.kind === first.kind && origin.text === first.text;
  return untouched ? { ...next, origins: { ...draft.origins, [field]: { kind: "shop", text: "" } } } : next;
}
