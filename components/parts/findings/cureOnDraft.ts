import { applyCure } from "@/bending/findings/applyCure";
import type { Cure } from "@/bending/findings/finding";
import type { BendDraft, FlangeDraft, HoleDraft, PartDraft } from "../draft/partDraft";

/** The draft with a cure's field set as if it had been typed; null when the form has no such field. */
export function cureOnDraft(draft: PartDraft, { path, value, says }: Cure): PartDraft | null {
  const text = typeof value === "number" ? String(value) : null;
  if (text === null) return reliefAdded(draft, path);
  if (path === "insideRadius") return { ...draft, radiusFrom: "typed", insideRadius: text };
  if (path === "relief.width") return { ...draft, relief: { ...draft.relief, width: text } };
  if (path === "profile.width") return { ...draft, width: text };
  if (path.startsWith("flat.")) return flatCured(draft, { path, value, says });
  const [, list, index, rest] = /^(profile\.legs|profile\.bends|flanges|base\.holes)\[(\d+)\](?:\.(.+))?$/.exec(path) ?? [];
  const at = Number(index);
  if (list === "profile.legs") return { ...draft, legs: replaced(draft.legs, at, (leg) => ({ ...leg, length: text })) };
  if (list === "profile.bends") return changedOrNull(draft.legs[at], (leg) => bendCured(leg.bend, rest, text), (leg, bend) => ({ ...draft, legs: replaced(draft.legs, at, () => ({ ...leg, bend })) }));
  if (list === "base.holes") return changedOrNull(draft.base.holes[at], (hole) => holeCured(hole, rest, text), (_, hole) => ({ ...draft, base: { ...draft.base, holes: replaced(draft.base.holes, at, () => hole) } }));
  if (list === "flanges") return changedOrNull(draft.flanges[at], (flange) => flangeCured(flange, rest, text), (_, flange) => ({ ...draft, flanges: replaced(draft.flanges, at, () => flange) }));
  return null;
}

function flatCured(draft: PartDraft, cure: Cure): PartDraft | null {
  if (draft.flat === null) return null;
  const [, index, field] = /^flat\.bends\[(\d+)\]\.(.+)$/.exec(cure.path) ?? [];
  if (index !== undefined) return changedOrNull(draft.flatBends[Number(index)], (bend) => bendCured(bend, field, String(cure.value)), (_, bend) => ({ ...draft, flatBends: replaced(draft.flatBends, Number(index), () => bend) }));
  return { ...draft, flat: applyCure({ flat: draft.flat }, cure).flat };
}

function reliefAdded(draft: PartDraft, path: string): PartDraft | null {
  const at = Number(/^flanges\[(\d+)\]\.relief$/.exec(path)?.[1] ?? -1);
  return draft.flanges[at] === undefined ? null : { ...draft, flanges: replaced(draft.flanges, at, (flange) => ({ ...flange, relief: { kind: "rectangular", width: "", depth: "" } })) };
}

function bendCured(bend: BendDraft, field: string | undefined, text: string): BendDraft | null {
  return field === "angle" || field === "insideRadius" ? { ...bend, [field]: text } : null;
}

function flangeCured(flange: FlangeDraft, field: string | undefined, text: string): FlangeDraft | null {
  if (field === "length" || field === "angle" || field === "insideRadius") return { ...flange, [field]: text };
  if (field === "relief.width") return { ...flange, relief: { ...flange.relief, width: text } };
  const [, index, rest] = /^holes\[(\d+)\]\.(.+)$/.exec(field ?? "") ?? [];
  return changedOrNull(flange.holes[Number(index)], (hole) => holeCured(hole, rest, text), (_, hole) => ({ ...flange, holes: replaced(flange.holes, Number(index), () => hole) }));
}

function holeCured(hole: HoleDraft, field: string | undefined, text: string): HoleDraft | null {
  if (hole.kind !== "circle") return null;
  if (field === "circle[0]") return { ...hole, x: text };
  return field === "circle[1]" ? { ...hole, y: text } : null;
}

function changedOrNull<T, C, R>(one: T | undefined, change: (one: T) => C | null, put: (one: T, changed: C) => R): R | null {
  const changed = one === undefined ? null : change(one);
  return one === undefined || changed === null ? null : put(one, changed);
}

const replaced = <T,>(list: readonly T[], at: number, change: (one: T) => T): readonly T[] => list.map((one, i) => (i === at ? change(one) : one));
