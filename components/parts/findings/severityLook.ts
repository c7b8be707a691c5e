import type { Severity } from "@/bending/findings/finding";
import type { StateTone } from "@/components/ui/StateMark";

/** Severities are told apart by word, by sign and by pattern; colour only adds to them. */
export const severityLook: Readonly<Record<Severity, { readonly tone: StateTone; readonly word: string; readonly colour: string; readonly says: (count: number) => string }>> = {
  stop: { tone: "stop", word: "stop", colour: "var(--brick)", says: (count) => `${count} that ${count === 1 ? "stops" : "stop"} it` },
  caution: { tone: "caution", word: "caution", colour: "var(--amber-ink)", says: (count) => (count === 1 ? "1 caution" : `${count} cautions`) },
  note: { tone: "note", word: "note", colour: "var(--steel-600)", says: (count) => (count === 1 ? "1 note" : `${count} notes`) },
};

export const severities: readonly Severity[] = ["stop", "caution", "note"];
