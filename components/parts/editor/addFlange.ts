import { edgeNames } from "../draft/edgeNames";
import { freeName } from "../draft/freeName";
import { newFlange } from "../draft/newRows";
import type { PartDraft } from "../draft/partDraft";

/** A new flange on a face: on the edge that was picked, else on its first free one. */
export function addFlange(draft: PartDraft, on: string, edge?: number): PartDraft {
  const taken = new Set(draft.flanges.filter((flange) => flange.on === on).map((flange) => flange.edge));
  const free = edge ?? edgeNames(draft, on).find((one) => !taken.has(one.edge))?.edge ?? 0;
  const alike = draft.flanges.findLast((flange) => flange.on === on)?.length ?? draft.flanges.at(-1)?.length;
  const id = freeName(["base", ...draft.flanges.map((flange) => flange.id)]);
  return { ...draft, flanges: [...draft.flanges, newFlange(id, on, free, alike ?? (draft.units === "mm" ? "25" : "1"))] };
}
