import type { LengthUnit } from "@/bending/core/units";
import { convertLengthText } from "@/lib/format/convertLengthText";
import { formatNumber } from "@/lib/format/formatNumber";
import { parseAngle } from "@/lib/format/parseAngle";
import { trialLimits, type TrialLengthField } from "@/lib/schemas/bendTableLimits";
import type { AngleKind, TrialDraft } from "./trialDraft";

const lengths = Object.keys(trialLimits) as readonly TrialLengthField[];

/** The same draft said in another unit of length, or with angles the other way; what cannot be read stays as typed. */
export function convertTrialDraft(draft: TrialDraft, to: { readonly units: LengthUnit; readonly angles: AngleKind }): TrialDraft {
  return {
    ...draft,
    ...to,
    lines: draft.lines.map((line) => ({
      ...line,
      ...Object.fromEntries(lengths.map((field) => [field, convertLengthText(line[field], draft.units, to.units)])),
      angle: to.angles === draft.angles ? line.angle : turnedRound(line.angle),
    })),
  };
}

function turnedRound(text: string): string {
  const read = parseAngle(text);
  return read.ok ? formatNumber(180 - read.value, 4) : text;
}
