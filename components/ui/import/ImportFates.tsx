"use client";
import { Check, RotateCcw } from "lucide-react";
import { useId, useState } from "react";
import { Button } from "../Button";
import { Choice } from "../Choice";
import { DataTable } from "../DataTable";
import { EmptyState } from "../EmptyState";
import { Notice } from "../Notice";
import { fateColumns, fateWords } from "./fateColumns";
import type { CsvDryRun, LineFate } from "@/lib/schemas/csvImport";

interface ImportFatesProps {
  readonly what: string;
  readonly dryRun: CsvDryRun;
  readonly note?: string;
  readonly busy: boolean;
  /** A confirmation was refused: only a new dry run can be confirmed. */
  readonly stale: boolean;
  readonly onBack: () => void;
  readonly onAgain: () => void;
  readonly onConfirm: (leaveOutRefused: boolean) => void;
}

const PAGE = 25;
const order: readonly LineFate[] = ["refused", "change", "add", "same"];

/** Every line's fate, by kind, with what is needed to confirm. */
export function ImportFates({ what, dryRun, note, busy, stale, onBack, onAgain, onConfirm }: ImportFatesProps) {
  const id = useId();
  const { counts } = dryRun;
  const [shown, setShown] = useState<LineFate | "all">(counts.refused > 0 ? "refused" : "all");
  const [page, setPage] = useState(1);
  const [leaveOut, setLeaveOut] = useState(false);
  const lines = shown === "all" ? dryRun.lines : dryRun.lines.filter(({ fate }) => fate === shown);
  const writing = counts.add + counts.change;
  const ready = writing > 0 && (counts.refused === 0 || leaveOut);
  const choices = [{ value: "all" as const, label: `All ${dryRun.lines.length}` }, ...order.filter((fate) => counts[fate] > 0).map((fate) => ({ value: fate, label: `${fateWords[fate].label} ${counts[fate]}` }))];
  return (
    <div className="space-y-4">
      <Notice tone={counts.refused > 0 ? "caution" : "note"} title={summary(counts)} live>
        {[...dryRun.notes, ...(note === undefined ? [] : [note])].map((text) => <p key={text}>{text}</p>)}
      </Notice>
      <Choice label="Lines shown" value={shown} onChange={(next) => { setShown(next); setPage(1); }} options={choices} />
      <DataTable caption={`What each line of ${what} would do`} columns={fateColumns} rows={lines.slice((page - 1) * PAGE, page * PAGE)} rowKey={(line) => String(line.line)}
        empty={<EmptyState title="No such line" />} dense
        list={{ q: "", sort: "line", dir: "asc", page, pageSize: PAGE, total: lines.length, onChange: (change) => { if (change.page !== undefined) setPage(change.page); } }} />
      {counts.refused === 0 || writing === 0 ? null : (
        <label htmlFor={`${id}-leave`} className="flex min-h-8 items-center gap-2">
          <input id={`${id}-leave`} type="checkbox" className="size-4.5 accent-(--accent)" checked={leaveOut} onChange={(event) => setLeaveOut(event.target.checked)} />
          Leave out the {counts.refused === 1 ? "refused line" : `${counts.refused} refused lines`} and write the rest
        </label>
      )}
      <div className="flex flex-wrap gap-2">
        {stale
          ? <Button icon={<RotateCcw aria-hidden />} busy={busy} onClick={onAgain}>New dry run</Button>
          : <Button icon={<Check aria-hidden />} busy={busy} disabled={!ready} onClick={() => onConfirm(leaveOut)}>{writing === 0 ? "Nothing to write" : `Write ${writing} ${writing === 1 ? "line" : "lines"}`}</Button>}
        <Button look="plain" onClick={onBack}>Back to the text</Button>
      </div>
    </div>
  );
}

function summary({ add, change, same, refused }: CsvDryRun["counts"]): string {
  const parts = [[add, "to be added"], [change, "to be changed"], [same, "as the shop has it"], [refused, "refused"]] as const;
  const said = parts.filter(([count]) => count > 0).map(([count, word]) => `${count} ${word}`).join(", ");
  return `Dry run, nothing written yet: ${said}`;
}
