import { fail, ok, type Result } from "@/bending/core/result";
import { deg, mm, mmPer, toRad, type LengthUnit } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { resolveAllowance } from "@/bending/handbook/resolveAllowance";
import { evaluateTrial } from "@/bending/shopTable/evaluateTrial";
import type { TrialResult } from "@/bending/shopTable/trialResult";
import { bendTrialOf, type InstrumentLookup } from "@/lib/schemas/bendTrialOf";
import { trialEntryField } from "@/lib/schemas/trialEntryField";
import { fieldWords } from "./fieldWords";
import type { LineProblems, ReadLine } from "./readTrialLine";
import { lineFields, type LineField, type TrialDraft } from "./trialDraft";

export interface LineResult {
  readonly result: TrialResult;
  /** What the handbook says for this very bend, mm. */
  readonly handbook: number;
}

interface ResultContext {
  readonly draft: Pick<TrialDraft, "measuredOn" | "lengthInstrument" | "thicknessInstrument" | "angleInstrument" | "radiusInstrument">;
  readonly units: LengthUnit;
  readonly material: MaterialFacts;
  readonly instruments: InstrumentLookup;
}

/** What comes of a line, or what cannot be true of it, by field. Null while an instrument is not chosen. */
export function lineResult(line: ReadLine, { draft, units, material, instruments }: ResultContext): Result<LineResult, LineProblems> | null {
  const measuredRadius = line.insideRadius !== null;
  const trial = bendTrialOf({
    ...line,
    lengthInstrument: draft.lengthInstrument,
    thicknessInstrument: draft.thicknessInstrument === "" ? null : draft.thicknessInstrument,
    angleInstrument: draft.angleInstrument,
    radiusInstrument: measuredRadius ? draft.radiusInstrument : null,
    measuredOn: draft.measuredOn,
  }, units, instruments);
  if (trial === undefined) return null;
  const found = evaluateTrial(trial, material);
  if (!found.ok) {
    const named = found.error.flatMap(({ path, message }) => {
      const field = lineFields.find((one) => one === trialEntryField(path));
      return field === undefined ? [] : [[field, `${fieldWords[field]} ${message}.`] as const];
    });
    return fail(Object.fromEntries(named) as Partial<Record<LineField, string>>);
  }
  const { deduction } = resolveAllowance({
    material, thickness: mm(line.thickness * mmPer(units)), insideRadius: found.value.insideRadius.value, angle: toRad(deg(line.angle)),
  });
  return ok({ result: found.value, handbook: deduction });
}
