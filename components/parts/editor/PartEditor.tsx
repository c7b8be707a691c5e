"use client";
import { useRef, useState, type FormEvent } from "react";
import { unitName } from "@/lib/format/unitName";
import type { FieldProblem } from "@/bending/core/problem";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Choice } from "@/components/ui/Choice";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { formatMoment } from "@/lib/format/formatMoment";
import { BendTable } from "../drawing/BendTable";
import { FlatFacts } from "../drawing/FlatFacts";
import { PartDrawings } from "../drawing/PartDrawings";
import { draftFromDocument } from "../draft/draftFromDocument";
import type { PartDraft } from "../draft/partDraft";
import { PartFindings } from "../findings/PartFindings";
import { FlatBends } from "../import/FlatBends";
import { BaseFields } from "./BaseFields";
import { CommonFields } from "./CommonFields";
import { computePreview } from "./computePreview";
import { EditorContext } from "./editorContext";
import { EditorHead } from "./EditorHead";
import { FlangeFields } from "./FlangeFields";
import { fieldId } from "./fieldId";
import { NameFields } from "./NameFields";
import { problemFinder } from "./problemFinder";
import { ProblemList } from "./ProblemList";
import { ProfileFields } from "./ProfileFields";
import { QuickStarts } from "./QuickStarts";
import { useEditorKeys } from "./useEditorKeys";
import { usePicking } from "./usePicking";
import { usePreview } from "./usePreview";
import type { useStoredDraft } from "./useStoredDraft";

interface PartEditorProps {
  readonly title: string;
  readonly materials: readonly MaterialFacts[];
  readonly store: ReturnType<typeof useStoredDraft>;
  readonly isNew: boolean;
  readonly saving: boolean;
  /** What the server refused, until something is changed. */
  readonly refused: readonly FieldProblem[];
  readonly message: React.ReactNode;
  readonly onChange: () => void;
  readonly onSave: (draft: PartDraft, document: unknown) => void;
}

export function PartEditor({ title, materials, store, isNew, saving, refused, message, onChange, onSave }: PartEditorProps) {
  const { draft } = store;
  const [tried, setTried] = useState(false);
  const preview = usePreview(draft, materials);
  const problems = [...preview.problems, ...refused].filter((problem) => tried || problem.path !== "name");
  const update = (change: (old: PartDraft) => PartDraft) => { onChange(); store.setDraft(change); };
  const editor = { draft, update, problemAt: problemFinder(problems, draft), gaugeGroup: materials.find(({ id }) => id === draft.material)?.group };
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    // The drawing may lag behind the typing; what is saved may not.
    const now = computePreview(draft, materials);
    if (now.model !== null && now.problems.length === 0) { onSave(draft, now.model.document); return; }
    const first = now.problems[0];
    if (first !== undefined) document.getElementById(fieldId(first.path))?.focus();
  };
  const stepping = (step: (() => void) | null) => (step === null ? null : () => { onChange(); step(); });
  const steps = { undo: stepping(store.undo), redo: stepping(store.redo) };
  const form = useRef<HTMLFormElement>(null);
  useEditorKeys({ ...steps, save: () => { if (!saving) form.current?.requestSubmit(); } });
  const { shown } = preview;
  const stale = preview.model === null;
  const { picking, onFocus } = usePicking({ draft, shown, update });
  return (
    <EditorContext value={editor}>
      <form ref={form} noValidate onSubmit={save} onFocus={onFocus}>
        <EditorHead title={title} isNew={isNew} saving={saving} document={preview.problems.length === 0 ? (preview.model?.document ?? null) : null} changed={store.changed} onUndo={steps.undo} onRedo={steps.redo} onStartAgain={store.startAgain}
          onImport={(document) => update((old) => ({ ...draftFromDocument(document, old.number), note: old.note }))} />
        <div className="mb-6 space-y-3 empty:hidden">
          {store.restoredAt === null ? null : <Notice tone="note" title="Your unsaved entries were brought back">They were last changed {formatMoment(store.restoredAt)} and are not saved yet.</Notice>}
          {message}
          <ProblemList problems={problems} draft={draft} />
        </div>
        <div className="grid grid-cols-1 gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,38rem)_minmax(0,1fr)]">
          <div className="space-y-8">
            <NameFields isNew={isNew} />
            <Panel title="Shape" aside={draft.shape === "flat" ? null : <ShapeChoice draft={draft} update={update} />}>
              {draft.shape === "flat" ? <FlatBends /> : (
                <div className="space-y-4">
                  <QuickStarts />
                  {draft.shape === "profile" ? <ProfileFields /> : <BaseFields />}
                </div>
              )}
            </Panel>
            {draft.shape === "base" ? <Panel title="Flanges" aside="name, edge, length, angle, direction"><FlangeFields /></Panel> : null}
            <Panel title="Material and measures"><CommonFields materials={materials} /></Panel>
          </div>
          <div className="space-y-6">
            {shown === null ? <p className="border border-dashed border-rule-strong p-8 text-center text-ink-soft">The drawings appear here as soon as the part can be built.</p> : (
              <>
                <FlatFacts part={shown.part} flat={shown.flat} units={shown.document.units} stale={stale} />
                <PartFindings model={shown} editing={{ draft, update }}>{(marks) => <PartDrawings {...marks} part={shown.part} flat={shown.flat} units={shown.document.units} dimension={shown.document.dimension ?? "outside"} stale={stale} picking={picking} />}</PartFindings>
                <Panel title="Bends" aside={`lengths in ${unitName(shown.document.units)}`}><BendTable part={shown.part} units={shown.document.units} /></Panel>
              </>
            )}
          </div>
        </div>
      </form>
    </EditorContext>
  );
}

function ShapeChoice({ draft, update }: { readonly draft: PartDraft; readonly update: (change: (old: PartDraft) => PartDraft) => void }) {
  return (
    <Choice<"profile" | "base"> label="Kind of part" labelHidden small value={draft.shape === "base" ? "base" : "profile"} onChange={(shape) => update((old) => ({ ...old, shape }))}
      options={[{ value: "profile", label: "Profile" }, { value: "base", label: "Base with flanges" }]} />
  );
}
