"use client";
import { Save } from "lucide-react";
import { useMemo, useRef, useState, type FormEvent, type ReactNode } from "react";
import { importNote } from "@/bending/exchange/dxf/import/importNote";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { PageHeader } from "@/components/ui/PageHeader";
import { Panel } from "@/components/ui/Panel";
import { StateMark } from "@/components/ui/StateMark";
import { useToast } from "@/components/ui/ToastProvider";
import { useCreatePart } from "@/lib/queries/parts";
import type { PartDraft } from "../draft/partDraft";
import { CommonFields } from "../editor/CommonFields";
import { computePreview } from "../editor/computePreview";
import { EditorContext } from "../editor/editorContext";
import { fieldId } from "../editor/fieldId";
import { NameFields } from "../editor/NameFields";
import { problemFinder } from "../editor/problemFinder";
import { problemsOfSave } from "../editor/problemsOfSave";
import { SaveProblem } from "../editor/SaveProblem";
import { useEditorKeys } from "../editor/useEditorKeys";
import { usePreview } from "../editor/usePreview";
import { WaitingToSave } from "../editor/WaitingToSave";
import { BendLineTable } from "./BendLineTable";
import { draftOfFlat, saidOfBends } from "./draftOfFlat";
import type { DrawingFacts } from "./drawingMessages";
import { DrawingSettings } from "./DrawingSettings";
import { ImportProblems } from "./ImportProblems";
import type { ImportForm } from "./importForm";
import { ReadSheet } from "./ReadSheet";
import { rememberImport } from "./rememberedImport";
import type { FoundDrawing } from "./useDrawing";

interface ReadDrawingProps {
  readonly file: File;
  readonly materials: readonly MaterialFacts[];
  readonly kicker: string;
  readonly list: ReactNode;
  readonly facts: DrawingFacts;
  readonly found: FoundDrawing;
  readonly form: ImportForm;
  readonly onForm: (form: ImportForm) => void;
  readonly onSaved: (part: { readonly id: string; readonly number: string }) => void;
  readonly onSkip: () => void;
}

/** A drawing that was read: choose what its lines are, say what it does not say, save. */
export function ReadDrawing({ file, materials, kicker, list, facts, found, form, onForm, onSaved, onSkip }: ReadDrawingProps) {
  const toast = useToast();
  const create = useCreatePart();
  const element = useRef<HTMLFormElement>(null);
  const [selected, setSelected] = useState<number | null>(null);
  const [place, setPlace] = useState<Vec2 | null>(null);
  const [tried, setTried] = useState(false);
  const draft = useMemo(() => draftOfFlat(found.flat, { draft: form.draft, bends: form.bends }), [found, form.draft, form.bends]);
  const preview = usePreview(draft, materials);
  const problems = draft.flat === null ? [] : [...preview.problems, ...problemsOfSave(create.error)].filter(({ path }) => tried || (path !== "name" && path !== "thickness") || draft.thickness !== "");
  const update = (change: (old: PartDraft) => PartDraft) => {
    if (create.isError) create.reset();
    const next = change(draft);
    onForm({ ...form, draft: { ...next, flat: null, flatBends: [] }, bends: saidOfBends(found.flat, next, form.bends), thicknessFrom: next.thickness === draft.thickness ? form.thicknessFrom : null });
  };
  const saving = create.isPending || create.isSuccess;
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const now = computePreview(draft, materials);
    const first = !form.unitSaid ? "drawing-unit" : draft.flat === null ? "drawing-lines" : now.problems[0] === undefined ? null : fieldId(now.problems[0].path);
    if (first !== null || now.model === null) { document.getElementById(first ?? "")?.focus(); return; }
    const note = [draft.note.trim(), importNote(file.name, facts.units, form.unit, found.flat, facts.notes)].filter((text) => text !== "").join(" ").slice(0, 2000);
    create.mutate({ document: now.model.document, note, ...(draft.number.trim() === "" ? {} : { number: draft.number.trim() }) }, {
      onSuccess: (part) => {
        const roles = Object.fromEntries(facts.groups.filter(({ hidden }) => !hidden).map(({ key, layer }) => [layer, form.roles[key] ?? "cut"]));
        rememberImport({ material: draft.material, thickness: draft.thickness, units: draft.units, roles });
        toast("good", "Part saved", `${part.number}, revision ${part.revision.revision}`);
        onSaved({ id: part.id, number: part.number });
      },
    });
  };
  useEditorKeys({ undo: null, redo: null, save: () => { if (!saving) element.current?.requestSubmit(); } });
  const editor = { draft, update, problemAt: problemFinder(problems, draft), gaugeGroup: materials.find(({ id }) => id === draft.material)?.group };
  return (
    <EditorContext value={editor}>
      <form ref={element} noValidate onSubmit={save}>
        <PageHeader kicker={kicker} title={file.name} actions={(
          <>
            <Button look="plain" onClick={onSkip}>Leave this file out</Button>
            <Button type="submit" busy={saving} icon={<Save aria-hidden />}>Save part</Button>
          </>
        )} />
        {list}
        <div className="mb-6 space-y-3 empty:hidden">
          {create.isPaused ? <WaitingToSave /> : create.error === null ? null : <SaveProblem error={create.error} />}
          <ImportProblems draft={draft} found={found} problems={problems} materials={materials} unitOpen={tried && !form.unitSaid} update={update} />
        </div>
        <div className="grid grid-cols-1 gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(0,38rem)]">
          <ReadSheet draft={draft} facts={facts} found={found} form={form} preview={preview} selected={selected} onSelect={setSelected} place={place} onPlace={setPlace} />
          <div className="space-y-8">
            <DrawingSettings facts={facts} found={found} form={form} onForm={onForm} />
            <Panel title="Bend lines" aside="the selected one stands out in the drawing"><BendLineTable selected={selected} onSelect={setSelected} /></Panel>
            <Panel title="Material and measures" aside={form.thicknessFrom === null ? undefined : <StateMark tone="caution">thickness {form.thicknessFrom}: check it</StateMark>}><CommonFields materials={materials} /></Panel>
            <Panel title="Name"><NameFields isNew /></Panel>
          </div>
        </div>
      </form>
    </EditorContext>
  );
}
