import { mmPer } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { formatNumber } from "@/lib/format/formatNumber";
import type { PartDraft } from "../draft/partDraft";
import { computePreview } from "../editor/computePreview";

/** Inside radii that tools are made for, mm; from large to small. */
const RADII = [6, 5, 4, 3, 2.5, 2, 1.6, 1.2, 1, 0.8, 0.6, 0.5, 0.4, 0.3, 0.2];

/**
 * The draft with the largest usual inside radius for which its bends fit between the cuts and reliefs drawn, or null when none does. A flat
 * is drawn for a certain radius; with a larger one the bends reach farther than its author left room for.
 */
export function fittingRadius(draft: PartDraft, materials: readonly MaterialFacts[]): PartDraft | null {
  for (const radius of RADII) {
    const tried: PartDraft = {
      ...draft, radiusFrom: "typed", insideRadius: formatNumber(radius / mmPer(draft.units), 4),
      flatBends: draft.flatBends.map((bend) => (bend.hem === "none" ? { ...bend, insideRadius: "" } : bend)),
    };
    if (computePreview({ ...tried, name: "-" }, materials).problems.length === 0) return tried;
  }
  return null;
}
