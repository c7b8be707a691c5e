import type { InstrumentView } from "@/lib/schemas/bendTableViews";
import type { InstrumentKind } from "@/lib/schemas/bendTableInputs";
import { nextLine } from "./nextLine";
import type { TrialDraft } from "./trialDraft";

/** A fresh page of the notebook, with the shop's first instrument of each kind. */
export function firstDraft(id: string, measuredOn: string, measuredBy: string, instruments: readonly InstrumentView[]): TrialDraft {
  const first = (...kinds: readonly InstrumentKind[]) => instruments.find(({ kind, withdrawn }) => withdrawn === null && kinds.includes(kind))?.id ?? "";
  return {
    units: "mm", angles: "turned", measuredOn, measuredBy,
    lengthInstrument: first("calliper", "height gauge", "micrometer"),
    thicknessInstrument: first("micrometer"),
    angleInstrument: first("protractor"),
    radiusInstrument: first("radius gauge"),
    lines: [nextLine(id)],
  };
}
