import type { Repair } from "../contour/piece";
import type { FoundFlat } from "./foundFlat";
import type { UnitDecision } from "./decideUnits";
import { drawingUnitName, type DrawingUnit } from "./drawingUnit";

/** What a revision's note may hold. */
const LONGEST = 1900;
const SPELT_OUT = 12;

/** What was read, decided, mended and left out, for the note of the part's first revision. */
export function importNote(file: string, units: UnitDecision, unit: DrawingUnit, found: FoundFlat, notes: readonly { readonly line: number; readonly message: string }[]): string {
  const { repairs, leftovers } = found;
  const lines = [
    `From ${file}, lengths in ${drawingUnitName[unit]}${units.header !== null && units.header !== unit ? ` (its header says ${drawingUnitName[units.header]})` : ""}.`,
    repairs.length === 0 ? "Nothing was mended." : `Mended (${summary(repairs)}): ${some(repairs.map(({ message }) => message))}.`,
    ...(leftovers.length === 0 ? [] : [`Left out: ${some(leftovers.map(({ what }) => what))}.`]),
    ...(notes.length === 0 ? [] : [`Not read: ${some(notes.map(({ line, message }) => `line ${line}: ${message}`))}.`]),
  ];
  const text = lines.join(" ");
  return text.length <= LONGEST ? text : `${text.slice(0, LONGEST)} ...`;
}

function some(texts: readonly string[]): string {
  const more = texts.length - SPELT_OUT;
  return texts.slice(0, SPELT_OUT).join("; ") + (more > 0 ? `; and ${more} more` : "");
}

function summary(repairs: readonly Repair[]): string {
  const counts = new Map<string, number>();
  for (const { kind } of repairs) counts.set(kind, (counts.get(kind) ?? 0) + 1);
  return [...counts].map(([kind, count]) => `${count} ${kind}`).join(", ");
}
