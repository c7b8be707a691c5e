import type { TrialDraft } from "./trialDraft";

export type HeadField = "measuredOn" | "measuredBy" | "lengthInstrument" | "thicknessInstrument" | "angleInstrument" | "radiusInstrument";

/** What is wrong with what holds for all lines, by field. */
export function headProblems(draft: TrialDraft, { today, inUse }: { readonly today: string; readonly inUse: (instrument: string) => boolean }): Readonly<Partial<Record<HeadField, string>>> {
  const day = new Date(`${draft.measuredOn}T00:00:00Z`);
  const radius = draft.lines.some(({ insideRadius }) => insideRadius.trim() !== "");
  return {
    ...(draft.measuredOn === "" || Number.isNaN(day.getTime()) ? { measuredOn: "Give the day on which the trials were measured." } : draft.measuredOn > today ? { measuredOn: "This day is still to come." } : {}),
    ...(draft.measuredBy.trim() === "" ? { measuredBy: "Say who measured." } : draft.measuredBy.trim().length > 120 ? { measuredBy: "At most 120 characters." } : {}),
    ...(!inUse(draft.lengthInstrument) ? { lengthInstrument: "Choose what the flanges were measured with." } : {}),
    ...(draft.thicknessInstrument !== "" && !inUse(draft.thicknessInstrument) ? { thicknessInstrument: "Choose what the thickness was measured with." } : {}),
    ...(!inUse(draft.angleInstrument) ? { angleInstrument: "Choose what the angles were measured with." } : {}),
    ...(radius && !inUse(draft.radiusInstrument) ? { radiusInstrument: "Choose what the inside radii were measured with, or leave the radii out." } : {}),
  };
}
