import type { PartDocument } from "../../part/partDocument";
import { partSource } from "../../part/partSource";

/** The field of the document that holds a face's length, in the document's unit; null where an outline was drawn. */
export function lengthField(document: PartDocument, face: string): { readonly path: string; readonly length: number } | null {
  if (document.flat !== undefined) return null;
  if (document.profile !== undefined && face === "base") return { path: "profile.legs[0]", length: document.profile.legs[0] ?? 0 };
  const flange = partSource(document).flanges.find(({ entry }) => entry.id === face);
  if (flange?.entry.length === undefined || flange.entry.outline !== undefined) return null;
  return { path: flange.lengthPath, length: flange.entry.length };
}
