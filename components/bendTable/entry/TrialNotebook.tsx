"use client";
import { useEffect, useEffectEvent, useMemo, useState } from "react";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { formatMoment } from "@/lib/format/formatMoment";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useAddTrials } from "@/lib/queries/bendTable";
import type { AddedTrials, InstrumentView } from "@/lib/schemas/bendTableViews";
import type { MaterialView } from "@/lib/schemas/materialViews";
import { cellId } from "./cellId";
import { EntryHead } from "./EntryHead";
import { EntryNotes } from "./EntryNotes";
import { firstDraft } from "./firstDraft";
import { headProblems } from "./headProblems";
import { newTrialId } from "./newTrialId";
import { nextLine } from "./nextLine";
import { NotebookHeader } from "./NotebookHeader";
import { readRow, type RowContext } from "./readRow";
import { refusedLines } from "./refusedLines";
import { SavedTrials } from "./SavedTrials";
import { lineFields, type TrialDraft, type TrialLine } from "./trialDraft";
import type { Keeper } from "./TrialEntry";
import { TrialGrid } from "./TrialGrid";
import { useTrialDraft } from "./useTrialDraft";
import { useTrialRows } from "./useTrialRows";

interface TrialNotebookProps {
  readonly person: Keeper;
  /** What the first line begins with, from a suggestion. */
  readonly wanted: Partial<TrialLine>;
  readonly materials: readonly MaterialView[];
  readonly instruments: readonly InstrumentView[];
}

const today = (): string => new Date().toLocaleDateString("sv-SE");

/** The page that is being written: kept in the browser until every line of it is saved at once. */
export function TrialNotebook({ person, wanted, materials, instruments }: TrialNotebookProps) {
  const add = useAddTrials();
  const fresh = (last: TrialDraft | null): TrialDraft => {
    const page = last === null ? firstDraft(newTrialId(), today(), person.name, instruments) : { ...last, measuredOn: today() };
    return Object.keys(wanted).length === 0 ? page : { ...page, lines: [{ ...nextLine(newTrialId()), ...wanted }] };
  };
  const { draft, setDraft, restoredAt, startAgain } = useTrialDraft(person.id, fresh);
  const [tried, setTried] = useState(false);
  const [saved, setSaved] = useState<AddedTrials | null>(null);
  const [undone, setUndone] = useState<{ readonly what: string; readonly before: TrialDraft } | null>(null);
  const [sent, setSent] = useState<readonly string[]>([]);
  const { lines, units, angles, measuredOn, measuredBy, lengthInstrument, thicknessInstrument, angleInstrument, radiusInstrument } = draft;
  const context = useMemo((): RowContext => {
    const byId = new Map(instruments.filter(({ withdrawn }) => withdrawn === null).map((one) => [one.id, one]));
    return { head: { units, angles, measuredOn, measuredBy, lengthInstrument, thicknessInstrument, angleInstrument, radiusInstrument }, materials, instruments: (id) => byId.get(id) };
  }, [units, angles, measuredOn, measuredBy, lengthInstrument, thicknessInstrument, angleInstrument, radiusInstrument, materials, instruments]);
  const wrongHead = headProblems(draft, { today: today(), inUse: (id) => context.instruments(id) !== undefined });
  const refused = add.error instanceof ApiProblem ? refusedLines(add.error.errors, sent) : new Map<string, never>();
  const update: typeof setDraft = (next) => { if (add.isError) add.reset(); if (saved !== null) setSaved(null); setDraft(next); };

  const save = () => {
    if (add.isPending) return;
    setTried(true);
    const rows = lines.map((line) => ({ line, read: readRow(line, context) })).filter(({ read }) => !read.blank);
    const faulty = rows.find(({ read }) => read.entry === null);
    const entries = rows.flatMap(({ read }) => read.entry ?? []);
    const firstWrong = Object.keys(wrongHead)[0];
    if (firstWrong !== undefined) { document.getElementById(`trials-${firstWrong}`)?.focus(); return; }
    if (faulty !== undefined || entries.length === 0) {
      const field = lineFields.find((one) => faulty?.read.problems[one] !== undefined) ?? "material";
      document.getElementById(cellId(faulty?.line.id ?? lines[0]?.id ?? "", field))?.focus();
      return;
    }
    setSent(entries.map(({ id }) => id));
    add.mutate({ units, lines: entries }, {
      onSuccess: (answer) => {
        const last = lines.findLast((line) => entries.some(({ id }) => id === line.id));
        setTried(false);
        setUndone(null);
        setSaved(answer);
        startAgain({ ...draft, lines: [nextLine(newTrialId(), last)] });
      },
    });
  };
  const actions = useTrialRows(draft, update, { onSave: save, onRemoved: (what, before) => setUndone({ what, before }) });
  const throwAway = () => {
    setTried(false);
    setUndone({ what: "The page was thrown away.", before: draft });
    startAgain({ ...draft, lines: [nextLine(newTrialId())] });
  };
  const begin = useEffectEvent(() => {
    const line = lines.at(-1);
    const field = lineFields.find((one) => line?.[one] === "" && one !== "batch" && one !== "nominal") ?? "material";
    document.getElementById(cellId(line?.id ?? "", field))?.focus();
  });
  useEffect(() => begin(), []);
  const count = lines.filter((line) => !readRow(line, context).blank).length;
  return (
    <>
      <NotebookHeader count={count} busy={add.isPending} onSave={save} onThrowAway={throwAway} />
      <div className="space-y-4 pb-4 empty:hidden">
        {saved === null ? null : <SavedTrials saved={saved} />}
        {restoredAt === null ? null : <Notice tone="note" title={`This page was begun before, last changed ${formatMoment(restoredAt)}`}>It is kept in this browser until it is saved.</Notice>}
        {add.error === null ? null : <Notice tone="wrong" title="Nothing was saved; what you entered is still here" live>{add.error.message}</Notice>}
      </div>
      <EntryHead draft={draft} update={update} materials={materials} instruments={instruments} problems={tried ? wrongHead : {}} />
      <TrialGrid lines={lines} context={context} offered={materials.filter(({ withdrawn }) => withdrawn === null)} refused={refused} tried={tried} actions={actions} />
      {undone === null ? null : (
        <p role="status" className="mt-2 flex flex-wrap items-center gap-3">{undone.what}
          <Button look="plain" size="small" onClick={() => { update(() => undone.before); setUndone(null); }}>Bring it back</Button>
        </p>
      )}
      <EntryNotes />
    </>
  );
}
