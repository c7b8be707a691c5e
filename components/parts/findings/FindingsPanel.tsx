"use client";
import { ChevronDown, ChevronUp } from "lucide-react";
import { useId, useRef, useState } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { Cure, Finding } from "@/bending/findings/finding";
import { Button } from "@/components/ui/Button";
import { classes } from "@/components/ui/classes";
import { StateMark } from "@/components/ui/StateMark";
import { FindingRow } from "./FindingRow";
import { severities, severityLook } from "./severityLook";
import type { FindingsState } from "./useFindings";

interface FindingsPanelProps {
  /** Null while the part is judged for the first time. */
  readonly findings: FindingsState | null;
  readonly units: LengthUnit;
  readonly selected: string | null;
  readonly onSelect: (key: string | null) => void;
  /** Gives a cure's field its name and a way to change it; null for a field that is not on the form. */
  readonly cureOf?: (cure: Cure) => { readonly field: string; readonly apply: () => void } | null;
  /** Of a shop that could not be asked. */
  readonly shopMissing?: boolean;
}

/** What is wrong with the part, the worst first; small enough to stand over the drawings, which it marks. */
export function FindingsPanel({ findings, units, selected, onSelect, cureOf, shopMissing = false }: FindingsPanelProps) {
  const id = useId();
  const [open, setOpen] = useState(true);
  const panel = useRef<HTMLElement>(null);
  const list = findings?.list ?? [];
  const cureFor = (finding: Finding) => {
    const way = finding.cure === null ? null : (cureOf?.(finding.cure) ?? null);
    if (way === null) return undefined;
    // The row goes when its finding does; the keyboard stays with the list.
    return { field: way.field, apply: () => { way.apply(); onSelect(null); panel.current?.focus(); } };
  };
  return (
    <section ref={panel} tabIndex={-1} aria-labelledby={`${id}-title`} className="border border-steel-500 bg-sheet outline-offset-0">
      <div className={classes("flex flex-wrap items-center gap-x-3 gap-y-1 px-2 py-1", open && list.length > 0 && "border-b border-steel-500")}>
        <h2 id={`${id}-title`} className="caption">Findings</h2>
        <div role="status" aria-busy={findings?.behind === true} className="flex grow flex-wrap items-center gap-2 text-sm">
          {findings === null ? <span className="text-ink-faint">Judging the part…</span> : null}
          {findings !== null && list.length === 0 ? <StateMark tone="good">nothing found</StateMark> : null}
          {severities.map((severity) => {
            const count = list.filter((finding) => finding.severity === severity).length;
            return count === 0 ? null : <StateMark key={severity} tone={severityLook[severity].tone}>{severityLook[severity].says(count)}</StateMark>;
          })}
          {findings !== null && findings.leftOut.length > 0 ? <span className="text-ink-faint">{shopMissing ? "The shop could not be asked; not judged" : "Not judged"}: {findings.leftOut.join(", ")}.</span> : null}
        </div>
        {list.length === 0 ? null : (
          <Button look="quiet" size="small" aria-expanded={open} aria-controls={`${id}-list`} icon={open ? <ChevronUp aria-hidden /> : <ChevronDown aria-hidden />} onClick={() => { setOpen(!open); onSelect(null); }}>
            {open ? "Hide" : "Show"}<span className="sr-only"> the findings</span>
          </Button>
        )}
      </div>
      {open && list.length > 0 ? (
        <ul id={`${id}-list`} className="max-h-44 overflow-y-auto">
          {list.map((finding) => <FindingRow key={finding.key} finding={finding} units={units} selected={finding.key === selected} onSelect={onSelect} cure={cureFor(finding)} />)}
        </ul>
      ) : null}
    </section>
  );
}
