import type { PartDraft } from "./partDraft";

/** The field that says how long a face is, as a path of the document; a face with an outline of its own is found at its angle. */
export function pathOfFace(draft: PartDraft, face: string): string | null {
  if (draft.shape === "profile") return `profile.legs[${face === "base" ? 0 : Number(face.slice(1))}]`;
  if (draft.shape === "flat") return face === "base" ? null : pathOfBend(draft, face);
  if (face === "base") return draft.base.kind === "rectangle" ? "base.width" : "base.outline[0]";
  const index = draft.flanges.findIndex(({ id }) => id === face);
  if (index < 0) return null;
  return `flanges[${index}].${draft.flanges[index]?.outline === null ? "length" : "angle"}`;
}

/** The field that says how far a bend turns. */
export function pathOfBend(draft: PartDraft, bend: string): string | null {
  if (draft.shape === "profile") return `profile.bends[${Number(bend.slice(1)) - 1}].angle`;
  const index = draft.shape === "flat" ? (draft.flat?.bends.findIndex(({ id }) => id === bend) ?? -1) : draft.flanges.findIndex(({ id }) => id === bend);
  return index < 0 ? null : `${draft.shape === "flat" ? "flat.bends" : "flanges"}[${index}].angle`;
}

/** The face that a field of the form is about; null when it is about none. */
export function faceOfField(draft: PartDraft, field: string): string | null {
  const [, kind, place] = /^at-(profile-legs|profile-bends|flanges|base|flat-bends)-?(\d*)/.exec(field) ?? [];
  const index = Number(place);
  switch (kind) {
    case "base": return "base";
    case "profile-legs": return index === 0 ? "base" : `b${index}`;
    case "profile-bends": return `b${index + 1}`;
    case "flanges": return draft.flanges[index]?.id ?? null;
    case "flat-bends": return draft.flat?.bends[index]?.id ?? null;
    default: return null;
  }
}
