import type { AddTrialsInput } from "@/lib/schemas/bendTableInputs";
import type { InstrumentLookup } from "@/lib/schemas/bendTrialOf";
import type { MaterialFacts } from "@/bending/handbook/material";
import { isBlankLine } from "./isBlankLine";
import { lineResult, type LineResult } from "./lineResult";
import { readTrialLine, type LineProblems } from "./readTrialLine";
import type { TrialDraft, TrialLine } from "./trialDraft";

export type DraftHead = Omit<TrialDraft, "lines">;

export interface RowContext {
  readonly head: DraftHead;
  readonly materials: readonly MaterialFacts[];
  readonly instruments: InstrumentLookup;
}

export interface ReadRow {
  /** Nothing was measured on it yet; it is not saved. */
  readonly blank: boolean;
  readonly problems: LineProblems;
  readonly result: LineResult | null;
  /** As it is sent; null while something is wrong with it. */
  readonly entry: AddTrialsInput["lines"][number] | null;
}

/** A line with what comes of it, what is wrong with it, and what would be sent. */
export function readRow(line: TrialLine, { head, materials, instruments }: RowContext): ReadRow {
  if (isBlankLine(line)) return { blank: true, problems: {}, result: null, entry: null };
  const read = readTrialLine(line, { units: head.units, angles: head.angles, materials });
  if (!read.ok) return { blank: false, problems: read.error, result: null, entry: null };
  const material = materials.find(({ id }) => id === read.value.material);
  const result = material === undefined ? null : lineResult(read.value, { draft: head, units: head.units, material, instruments });
  if (result === null || !result.ok) return { blank: false, problems: result?.error ?? {}, result: null, entry: null };
  const { lengthInstrument, angleInstrument, thicknessInstrument, radiusInstrument, measuredOn, measuredBy } = head;
  return {
    blank: false, problems: {}, result: result.value,
    entry: {
      ...read.value, lengthInstrument, angleInstrument, measuredOn, measuredBy: measuredBy.trim(),
      thicknessInstrument: thicknessInstrument === "" ? null : thicknessInstrument,
      radiusInstrument: read.value.insideRadius === null ? null : radiusInstrument,
    },
  };
}
