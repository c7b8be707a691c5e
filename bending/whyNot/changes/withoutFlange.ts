import type { PartDocument } from "../../part/partDocument";

/** The document without a flange and all that hangs on it, and their bends, that flange first; null where nothing can be taken off or nothing would be left to bend. */
export function withoutFlange(document: PartDocument, face: string): { readonly document: PartDocument; readonly gone: readonly string[] } | null {
  if (document.flanges !== undefined) {
    const gone = [face];
    for (const id of gone) gone.push(...document.flanges.filter(({ on }) => on === id).map((flange) => flange.id));
    const flanges = document.flanges.filter(({ id }) => !gone.includes(id));
    return flanges.length === document.flanges.length || flanges.length === 0 ? null : { document: { ...document, flanges }, gone };
  }
  if (document.profile === undefined) return null;
  const { legs, bends, width } = document.profile;
  const at = bends.findIndex((_, i) => `b${i + 1}` === face);
  if (at < 1) return null;
  const gone = bends.slice(at).map((_, i) => `b${at + i + 1}`);
  return { document: { ...document, profile: { width, legs: legs.slice(0, at + 1), bends: bends.slice(0, at) } }, gone };
}
