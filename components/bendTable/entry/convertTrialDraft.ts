import type { LengthUnit } from "@/bending/core/units";
import { convertLengthText } from "@/lib/format/convertLengthText";
import { formatNumber } from "@/lib/format/formatNumber";
import { parseAngle } from "@/lib/format/parseAngle";
import type { MaterialFacts } from "@/bending/handbook/material";
import { trialLimits, type TrialLengthField } from "@/lib/schemas/bendTableLimits";
import { standingNominal } from "./standingNominal";
import type { AngleKind, TrialDraft } from "./trialDraft";

const lengths = Object.keys(trialLimits) as readonly TrialLengthField[];

/**
 * The same draft said in another unit of length, or with angles the other way; what cannot be read stays as typed. A nominal thickness
 * that was left empty is filled in when the unit changes: in the other unit the nearest usual one would be another.
 */
export function convertTrialDraft(draft: TrialDraft, to: { readonly units: LengthUnit; readonly angles: AngleKind }, materials: readonly MaterialFacts[]): TrialDraft {
  const nominal = (line: TrialDraft["lines"][number]) =>
    (line.nominal.trim() !== "" || to.units === draft.units ? line.nominal : (standingNominal(line, draft.units, materials) ?? ""));
  return {
    ...draft,
    ...to,
    lines: draft.lines.map((line) => ({
      ...line,
      ...Object.fromEntries(lengths.map((field) => [field, convertLengthText(field === "nominal" ? nominal(line) : line[field], draft.units, to.units)])),
      angle: to.angles === draft.angles ? line.angle : turnedRound(line.angle),
    })),
  };
}

function turnedRound(text: string): string {
  const read = parseAngle(text);
  return read.ok ? formatNumber(180 - read.value, 4) : text;
}
