import type { FieldProblem } from "@/bending/core/problem";
import { mmPer, type LengthUnit } from "@/bending/core/units";
import type { MaterialLookup } from "@/bending/handbook/material";
import { trialProblems } from "@/bending/shopTable/trialProblems";
import type { InstrumentRow } from "@/db/bendTrials/instrumentRow";
import { formatLength } from "@/lib/format/formatLength";
import { trialLengthFields, type TrialLineInput } from "@/lib/schemas/bendTableInputs";
import { trialLimits } from "@/lib/schemas/bendTableLimits";
import { bendTrialOf } from "@/lib/schemas/bendTrialOf";
import { trialEntryField } from "@/lib/schemas/trialEntryField";

export interface EntryContext {
  readonly units: LengthUnit;
  readonly materials: MaterialLookup;
  /** Those in use. */
  readonly instruments: ReadonlyMap<string, InstrumentRow>;
  readonly parts: ReadonlySet<string>;
  readonly sheets: ReadonlySet<string>;
  /** `2026-12-01`: a trial is not measured after it. */
  readonly lastDay: string;
}

/** Everything that keeps one line from being a trial, field by field, in the line's own units. */
export function entryProblems(line: TrialLineInput, context: EntryContext): readonly FieldProblem[] {
  const { units, materials, instruments } = context;
  const material = materials(line.material);
  const first = [
    ...(material === undefined ? [{ path: "material", message: `"${line.material}" is not a material of this shop` }] : []),
    ...trialLengthFields.flatMap((field) => outside(field, line[field], units)),
    ...instrumentProblems(line, instruments),
    ...(line.measuredOn > context.lastDay ? [{ path: "measuredOn", message: "is still to come" }] : []),
    ...(line.partId !== null && !context.parts.has(line.partId) ? [{ path: "partId", message: "is no part that is there" }] : []),
    ...(line.sheetId !== null && !context.sheets.has(line.sheetId) ? [{ path: "sheetId", message: "is no setup sheet that is there" }] : []),
  ];
  if (first.length > 0 || material === undefined) return first;
  const trial = bendTrialOf(line, units, (id) => instruments.get(id));
  return trial === undefined ? [] : trialProblems(trial, material).map(({ path, message }) => ({ path: trialEntryField(path), message }));
}

function outside(field: keyof typeof trialLimits, value: number | null, units: LengthUnit): readonly FieldProblem[] {
  if (value === null) return [];
  const limits: { readonly above?: number; readonly least?: number; readonly most: number } = trialLimits[field];
  const length = value * mmPer(units);
  if (limits.above !== undefined && length <= limits.above) return [{ path: field, message: `must be more than ${formatLength(limits.above, units)}` }];
  if (limits.least !== undefined && length < limits.least) return [{ path: field, message: `must be ${formatLength(limits.least, units)} or more` }];
  return length > limits.most ? [{ path: field, message: `must be at most ${formatLength(limits.most, units)}` }] : [];
}

function instrumentProblems(line: TrialLineInput, instruments: ReadonlyMap<string, InstrumentRow>): readonly FieldProblem[] {
  return (["lengthInstrument", "thicknessInstrument", "angleInstrument", "radiusInstrument"] as const).flatMap((path) => {
    const id = line[path];
    if (id === null) return [];
    const instrument = instruments.get(id);
    if (instrument === undefined) return [{ path, message: "is no instrument in use" }];
    const angle = path === "angleInstrument";
    return (instrument.kind === "protractor") === angle ? [] : [{ path, message: angle ? `must be a protractor; ${instrument.name} is a ${instrument.kind}` : `must not be a protractor; ${instrument.name} is one` }];
  });
}
