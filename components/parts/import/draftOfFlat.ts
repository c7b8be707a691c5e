import { flatDocument } from "@/bending/exchange/dxf/import/flatDocument";
import type { FoundFlat } from "@/bending/exchange/dxf/import/foundFlat";
import { draftFromDocument } from "../draft/draftFromDocument";
import type { BendDraft, PartDraft } from "../draft/partDraft";
import type { ImportForm } from "./importForm";

/** A bend line by where it lies, to keep what was typed for it while other choices change. */
const placeOf = (found: FoundFlat, index: number): string => found.bends[index]?.line.map((p) => p.map((value) => value.toFixed(2)).join(" ")).join(" ") ?? "";

/** The draft of what was typed, with the flat found in the drawing. */
export function draftOfFlat(found: FoundFlat, { draft, bends }: Pick<ImportForm, "draft" | "bends">): PartDraft {
  const document = flatDocument(found, { name: "-", material: draft.material, thickness: 1, units: draft.units });
  if (document === null) return { ...draft, flat: null, flatBends: [] };
  const read = draftFromDocument(document);
  return { ...draft, shape: "flat", flat: read.flat, flatBends: read.flatBends.map((bend, i) => ({ ...bend, ...bends[placeOf(found, i)] })) };
}

/** What the next draft says otherwise than the drawing, by bend line. */
export function saidOfBends(found: FoundFlat, next: PartDraft, before: ImportForm["bends"]): ImportForm["bends"] {
  const drawn = draftOfFlat(found, { draft: next, bends: {} }).flatBends;
  const said: Record<string, Partial<BendDraft>> = { ...before };
  next.flatBends.forEach((bend, i) => {
    const own = drawn[i];
    if (own !== undefined) said[placeOf(found, i)] = Object.fromEntries(Object.entries(bend).filter(([key, value]) => own[key as keyof BendDraft] !== value));
  });
  return said;
}
