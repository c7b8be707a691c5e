"use client";
import { Save, Trash2 } from "lucide-react";
import Link from "next/link";
import { useMemo, useState } from "react";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { formatMoment } from "@/lib/format/formatMoment";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useAddTrials } from "@/lib/queries/bendTable";
import type { AddedTrials, InstrumentView } from "@/lib/schemas/bendTableViews";
import { cellId } from "./cellId";
import { EntryHead } from "./EntryHead";
import { EntryNotes } from "./EntryNotes";
import { firstDraft } from "./firstDraft";
import { headProblems } from "./headProblems";
import { newTrialId } from "./newTrialId";
import { nextLine } from "./nextLine";
import { readRow, type RowContext } from "./readRow";
import { refusedLines } from "./refusedLines";
import { SavedTrials } from "./SavedTrials";
import { lineFields } from "./trialDraft";
import type { Keeper } from "./TrialEntry";
import { TrialGrid } from "./TrialGrid";
import { useTrialDraft } from "./useTrialDraft";
import { useTrialRows } from "./useTrialRows";

interface TrialNotebookProps {
  readonly person: Keeper;
  readonly materials: readonly MaterialFacts[];
  readonly instruments: readonly InstrumentView[];
}

const today = (): string => new Date().toLocaleDateString("sv-SE");

/** The page that is being written: kept in the browser until every line of it is saved at once. */
export function TrialNotebook({ person, materials, instruments }: TrialNotebookProps) {
  const add = useAddTrials();
  const { draft, setDraft, restoredAt, startAgain } = useTrialDraft(person.id, () => firstDraft(newTrialId(), today(), person.name, instruments));
  const [tried, setTried] = useState(false);
  const [saved, setSaved] = useState<AddedTrials | null>(null);
  const { lines, units, angles, measuredOn, measuredBy, lengthInstrument, thicknessInstrument, angleInstrument, radiusInstrument } = draft;
  const context = useMemo((): RowContext => {
    const byId = new Map(instruments.filter(({ withdrawn }) => withdrawn === null).map((one) => [one.id, one]));
    return { head: { units, angles, measuredOn, measuredBy, lengthInstrument, thicknessInstrument, angleInstrument, radiusInstrument }, materials, instruments: (id) => byId.get(id) };
  }, [units, angles, measuredOn, measuredBy, lengthInstrument, thicknessInstrument, angleInstrument, radiusInstrument, materials, instruments]);
  const [sent, setSent] = useState<readonly string[]>([]);
  const refused = add.error instanceof ApiProblem ? refusedLines(add.error.errors, sent) : new Map();
  const update: typeof setDraft = (next) => { if (add.isError) add.reset(); if (saved !== null) setSaved(null); setDraft(next); };

  const save = () => {
    if (add.isPending) return;
    setTried(true);
    const rows = lines.map((line) => ({ line, read: readRow(line, context) })).filter(({ read }) => !read.blank);
    const head = Object.keys(headProblems(draft))[0];
    const faulty = rows.find(({ read }) => read.entry === null);
    if (head !== undefined) { document.getElementById(`trials-${head}`)?.focus(); return; }
    if (faulty !== undefined) {
      const field = lineFields.find((one) => faulty.read.problems[one] !== undefined) ?? "material";
      document.getElementById(cellId(faulty.line.id, field))?.focus();
      return;
    }
    const entries = rows.flatMap(({ read }) => read.entry ?? []);
    if (entries.length === 0) { document.getElementById(cellId(lines[0]?.id ?? "", "material"))?.focus(); return; }
    setSent(entries.map(({ id }) => id));
    add.mutate({ units, lines: entries }, {
      onSuccess: (answer) => {
        setTried(false);
        setSaved(answer);
        startAgain({ ...draft, lines: [nextLine(newTrialId(), lines.findLast((line) => entries.some(({ id }) => id === line.id)))] });
      },
    });
  };
  const actions = useTrialRows(draft, update, save);
  const count = lines.filter((line) => !readRow(line, context).blank).length;
  return (
    <>
      <PageHeader kicker="Bend table" title="Enter trials" summary="One line for each bent strip, as in the shop's notebook. What comes of it stands at the right as you type."
        actions={<>
          <Link href="/bend-table/import" className={buttonClasses("plain")}>From a file</Link>
          {restoredAt === null ? null : <Button look="plain" icon={<Trash2 aria-hidden />} onClick={() => { setTried(false); startAgain(firstDraft(newTrialId(), today(), person.name, instruments)); }}>Throw the page away</Button>}
          <Button icon={<Save aria-hidden />} busy={add.isPending} onClick={save}>{count === 0 ? "Save" : count === 1 ? "Save 1 trial" : `Save ${count} trials`}</Button>
        </>} />
      <div className="space-y-4 pb-4 empty:hidden">
        {saved === null ? null : <SavedTrials saved={saved} />}
        {restoredAt === null ? null : <Notice tone="note" title={`This page was begun before, last changed ${formatMoment(restoredAt)}`}>It is kept in this browser until it is saved.</Notice>}
        {add.error === null ? null : <Notice tone="wrong" title="Nothing was saved; what you entered is still here" live>{add.error.message}</Notice>}
      </div>
      <EntryHead draft={draft} update={update} materials={materials} instruments={instruments} problems={tried ? headProblems(draft) : {}} />
      <TrialGrid lines={lines} context={context} refused={refused} tried={tried} actions={actions} />
      <EntryNotes />
    </>
  );
}
