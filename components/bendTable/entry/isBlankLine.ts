import type { TrialLine } from "./trialDraft";

/** Nothing was measured on this line yet: what was copied into it from the line above does not count. */
export const isBlankLine = ({ angle, blank, flangeA, flangeB, insideRadius, note }: TrialLine): boolean =>
  [angle, blank, flangeA, flangeB, insideRadius, note].every((text) => text.trim() === "");
