import { lineFields, type LineField, type TrialLine } from "./trialDraft";

/** What stays the same from one trial to the next, and is copied from the line above. */
const kept: readonly LineField[] = ["material", "batch", "nominal", "thickness", "vOpening", "punchRadius"];

/** A new line under `above` (or the first one), with the given id. */
export function nextLine(id: string, above?: TrialLine): TrialLine {
  const texts = Object.fromEntries(lineFields.map((field) => [field, above !== undefined && kept.includes(field) ? above[field] : ""])) as Record<LineField, string>;
  return { ...texts, id };
}
