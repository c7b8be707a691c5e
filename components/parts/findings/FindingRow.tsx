"use client";
import type { KeyboardEvent } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { Finding } from "@/bending/findings/finding";
import { Button } from "@/components/ui/Button";
import { classes } from "@/components/ui/classes";
import { StateMark } from "@/components/ui/StateMark";
import { formatMeasure } from "./formatMeasure";
import { severityLook } from "./severityLook";

interface FindingRowProps {
  readonly finding: Finding;
  readonly units: LengthUnit;
  readonly selected: boolean;
  readonly onSelect: (key: string | null) => void;
  /** What the cure's field is called, and how it is changed; absent where nothing can be changed. */
  readonly cure?: { readonly field: string; readonly apply: () => void } | undefined;
}

/** One finding on one line; the selected one says the rest and is drawn on the part. */
export function FindingRow({ finding, units, selected, onSelect, cure }: FindingRowProps) {
  const look = severityLook[finding.severity];
  const about = [...new Set([...finding.faces, ...finding.bends])].slice(0, 3).join(", ");
  const short = cure?.field.split(", ").at(-1)?.toLowerCase() ?? "";
  const setTo = finding.cure === null || cure === undefined ? null : typeof finding.cure.value === "number" ? `Set ${short} to ${finding.cure.says}` : `Add ${finding.cure.says}`;
  return (
    <li className={classes("border-b border-rule last:border-b-0", selected && "bg-wash")}>
      <div className="flex flex-wrap items-center gap-x-2 gap-y-1 px-2 py-1">
        <button type="button" aria-expanded={selected} data-finding={finding.key} onFocus={() => onSelect(finding.key)} onKeyDown={(event) => moveFocus(event, () => onSelect(null))}
          className="flex min-h-8 min-w-0 grow basis-64 flex-wrap items-center gap-x-2 text-left" onClick={() => onSelect(selected ? null : finding.key)}>
          <StateMark tone={look.tone}>{look.word}</StateMark>
          <span className="font-medium">{finding.title}</span>
          {about === "" ? null : <span className="max-w-48 truncate text-ink-soft">{about}</span>}
          {finding.measure === null ? null : <span className="num whitespace-nowrap text-ink-soft">{formatMeasure(finding.measure, units)}</span>}
        </button>
        {setTo === null || cure === undefined ? null : (
          <Button look="plain" size="small" aria-label={`${setTo}: ${cure.field}`} onFocus={() => onSelect(finding.key)} onClick={cure.apply} onKeyDown={(event) => moveFocus(event, () => onSelect(null))}>{setTo}</Button>
        )}
      </div>
      {selected ? (
        <div className="space-y-1 px-2 pb-2 text-sm">
          <p>{finding.message}</p>
          <p className="text-ink-faint">Rule: {finding.source}.{finding.cure !== null && cure !== undefined ? ` Field: ${cure.field}.` : ""}</p>
        </div>
      ) : null}
    </li>
  );
}

/** Up and Down go from finding to finding; Escape takes the marks off the part. */
function moveFocus(event: KeyboardEvent<HTMLElement>, clear: () => void): void {
  if (event.key === "Escape") { clear(); return; }
  if (event.key !== "ArrowDown" && event.key !== "ArrowUp") return;
  event.preventDefault();
  const rows = [...(event.currentTarget.closest("ul")?.querySelectorAll<HTMLElement>("[data-finding]") ?? [])];
  const here = rows.findIndex((row) => row.closest("li") === event.currentTarget.closest("li"));
  rows[here + (event.key === "ArrowDown" ? 1 : -1)]?.focus();
}
