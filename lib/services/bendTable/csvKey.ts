import type { TrialCsvRow } from "./csvRowOf";

/** Digits that a file keeps: two lines that are equal in these are one measurement. */
const DIGITS = 8;

/**
 * Which trial a line is about: the one of its number; without a number the one that says the same, which is everything that was
 * measured, when, by whom, and the note.
 */
export function csvKey(row: Partial<TrialCsvRow>): string {
  if (row.number) return `number ${row.number}`;
  const { material, batch, nominal, thickness, vOpening, punchRadius, angle, blank, flangeA, flangeB, insideRadius, measuredOn, measuredBy, note } = row;
  const numbers = [nominal, thickness, vOpening, punchRadius, angle, blank, flangeA, flangeB, insideRadius];
  return JSON.stringify([material, batch ?? "", ...numbers.map((value) => value?.toPrecision(DIGITS) ?? ""), measuredOn, measuredBy, note ?? ""]);
}
