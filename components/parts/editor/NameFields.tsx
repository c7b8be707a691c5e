"use client";
import { TextInput } from "@/components/ui/TextInput";
import { useEditor } from "./editorContext";
import { fieldId } from "./fieldId";

/** What the part is called, and why this revision was made. */
export function NameFields({ isNew }: { readonly isNew: boolean }) {
  const { draft, update, problemAt } = useEditor();
  return (
    <div className="grid grid-cols-1 gap-x-4 gap-y-3 sm:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
      <TextInput id={fieldId("name")} label="Name" value={draft.name} onChange={(event) => update((old) => ({ ...old, name: event.target.value }))} error={problemAt("name")} />
      {isNew ? <TextInput id={fieldId("number")} label="Number" placeholder="given when saved" value={draft.number} onChange={(event) => update((old) => ({ ...old, number: event.target.value }))} error={problemAt("number")} /> : null}
      <TextInput id={fieldId("note")} label={isNew ? "Note" : "What was changed"} className="sm:col-span-2" value={draft.note} onChange={(event) => update((old) => ({ ...old, note: event.target.value }))} error={problemAt("note")}
        placeholder={isNew ? "" : "For whoever compares revisions later"} />
    </div>
  );
}
