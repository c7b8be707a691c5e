import { StateMark } from "@/components/ui/StateMark";
import type { FindingCounts } from "@/lib/schemas/findingCounts";
import { severities, severityLook } from "./severityLook";

/** A part's findings in a list, the worst first; undefined while they are counted, null for a part that cannot be built. */
export function FindingCountsCell({ counts }: { readonly counts: FindingCounts | null | undefined }) {
  if (counts === undefined) return <span className="text-ink-faint" aria-label="being counted">…</span>;
  if (counts === null) return <StateMark tone="stop">cannot be built</StateMark>;
  const told = severities.filter((severity) => counts[severity] > 0);
  if (told.length === 0) return <StateMark tone="good">none</StateMark>;
  return (
    <span className="flex flex-wrap gap-1">
      {told.map((severity) => <StateMark key={severity} tone={severityLook[severity].tone}><span className="num">{counts[severity]}</span><span className="sr-only">{severityLook[severity].word}</span></StateMark>)}
    </span>
  );
}
