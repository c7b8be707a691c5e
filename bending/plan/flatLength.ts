import type { PartDocument } from "../part/partDocument";
import type { PlanFlat } from "./planDocument";

/** The developed length of a profile; of any other part the longer side of its blank. */
export function flatLength(document: PartDocument, flat: Pick<PlanFlat, "width" | "depth">): number {
  return document.profile ? flat.width : Math.max(flat.width, flat.depth);
}
