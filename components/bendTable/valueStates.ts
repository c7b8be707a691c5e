import type { StateTone } from "@/components/ui/StateMark";
import type { TrialState, ValueState } from "@/lib/schemas/bendTableInputs";

/** A value's state in words: three trials at least, and none that lies apart, is what can be relied on. */
export const valueStateWords: Readonly<Record<ValueState, { readonly label: string; readonly tone: StateTone }>> = {
  ok: { label: "consistent", tone: "good" },
  outlier: { label: "outlier", tone: "caution" },
  few: { label: "too few", tone: "wait" },
  none: { label: "none counts", tone: "off" },
};

export const trialStateWords: Readonly<Record<TrialState, { readonly label: string; readonly tone: StateTone }>> = {
  counted: { label: "counts", tone: "good" },
  excluded: { label: "excluded", tone: "off" },
  withdrawn: { label: "withdrawn", tone: "stop" },
};
