"use client";
import { Save } from "lucide-react";
import { useState, type FormEvent, type ReactNode } from "react";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { TextArea } from "@/components/ui/TextArea";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { MaterialFields } from "./MaterialFields";
import type { MaterialDraft } from "./materialDraft";
import { readMaterialDraft } from "./readMaterialDraft";

interface MaterialFormProps {
  readonly start: MaterialDraft;
  /** The version that is changed; null: a new material. */
  readonly base: MaterialFacts | null;
  readonly busy: boolean;
  readonly error: Error | null;
  readonly onSave: (facts: MaterialFacts, note: string) => void;
  readonly onCancel: () => void;
  /** Stands over the fields, and may change them all. */
  readonly lead?: (draft: MaterialDraft, change: (draft: MaterialDraft) => void) => ReactNode;
  /** Said when somebody else was quicker: how to see theirs. */
  readonly onConflict?: ReactNode;
}

/** The form of a material; what is entered stays until it is saved. */
export function MaterialForm({ start, base, busy, error, onSave, onCancel, lead, onConflict }: MaterialFormProps) {
  const [draft, setDraft] = useState(start);
  const [compared, setCompared] = useState(start);
  const [note, setNote] = useState("");
  const [tried, setTried] = useState(false);
  const read = readMaterialDraft(draft, base);
  const refused = error instanceof ApiProblem ? [...error.errorsIn("facts")] : [];
  const problems = [...(tried && !read.ok ? read.error : []), ...refused];
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (read.ok) { onSave(read.value, note.trim()); return; }
    document.getElementById(`material-${read.error[0]?.path ?? ""}`)?.focus();
  };
  return (
    <form noValidate onSubmit={save} className="space-y-8">
      {error === null ? null : <Notice tone="wrong" title="Nothing was saved; what you entered is still here" live><p>{error.message}</p>{error instanceof ApiProblem && error.status === 409 ? onConflict : null}</Notice>}
      {tried && !read.ok ? <Notice tone="wrong" title={read.error.length === 1 ? "One value must be changed" : `${read.error.length} values must be changed`} live /> : null}
      {lead?.(draft, (next) => { setDraft(next); setCompared(next); })}
      <MaterialFields draft={draft} compared={compared} isNew={base === null} problems={problems} onChange={setDraft} />
      <div className="max-w-2xl">
        <TextArea id="material-note" label="Why, for the record" rows={2} maxLength={2000} value={note} onChange={(event) => setNote(event.target.value)} placeholder={base === null ? "New sheet from another supplier" : "New certificate, batch 4711"} />
      </div>
      <div className="flex flex-wrap gap-2">
        <Button type="submit" busy={busy} icon={<Save aria-hidden />}>{base === null ? "Add material" : "Save as a new version"}</Button>
        <Button look="plain" onClick={onCancel}>Cancel</Button>
      </div>
    </form>
  );
}
