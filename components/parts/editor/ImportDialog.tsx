"use client";
import { useState } from "react";
import type { FieldProblem } from "@/bending/core/problem";
import type { PartDocument } from "@/bending/part/partDocument";
import { readPartDocument } from "@/bending/part/readPartDocument";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { TextArea } from "@/components/ui/TextArea";

interface ImportDialogProps {
  readonly open: boolean;
  readonly onOpenChange: (open: boolean) => void;
  readonly onDocument: (document: PartDocument) => void;
}

/** More than any part needs, and little enough to read at once. */
const mostBytes = 2_000_000;

function readText(text: string): { readonly document: PartDocument } | { readonly problems: readonly FieldProblem[] } {
  try {
    const read = readPartDocument(JSON.parse(text));
    return read.ok ? { document: read.value } : { problems: read.error };
  } catch (thrown) {
    return { problems: [{ path: "", message: `This is not JSON: ${thrown instanceof Error ? thrown.message : "it cannot be read"}` }] };
  }
}

/** A part document, pasted or from a file; it replaces what is in the form. */
export function ImportDialog({ open, onOpenChange, onDocument }: ImportDialogProps) {
  const [text, setText] = useState("");
  const [problems, setProblems] = useState<readonly FieldProblem[]>([]);
  const take = () => {
    const read = readText(text);
    if ("problems" in read) { setProblems(read.problems); return; }
    setProblems([]);
    onDocument(read.document);
    onOpenChange(false);
  };
  const takeFile = async (file: File | undefined) => {
    if (file === undefined) return;
    if (file.size > mostBytes) { setProblems([{ path: "", message: `The file has ${(file.size / 1e6).toFixed(1)} MB; a part document may have at most 2 MB.` }]); return; }
    setText(await file.text());
    setProblems([]);
  };
  return (
    <DialogBox open={open} onOpenChange={onOpenChange} title="Import a part document" wide
      description="JSON in the format part/1. It replaces what is in the form; nothing is saved until you save."
      actions={<><Button look="plain" onClick={() => onOpenChange(false)}>Cancel</Button><Button onClick={take} disabled={text.trim() === ""}>Use this document</Button></>}>
      <div className="space-y-4">
        <label className="block">
          <span className="mb-1 block text-sm font-medium text-ink-soft">From a file</span>
          <input type="file" accept=".json,application/json" onChange={(event) => { void takeFile(event.target.files?.[0]); }}
            className="block w-full text-sm file:mr-3 file:min-h-9 file:rounded file:border file:border-rule-strong file:bg-sheet file:px-3 file:font-medium" />
        </label>
        <TextArea id="import-text" label="Or pasted" rows={12} numbers spellCheck={false} value={text} onChange={(event) => setText(event.target.value)} />
        {problems.length === 0 ? null : (
          <Notice tone="wrong" title={problems.length === 1 ? "The document cannot be used yet" : `The document has ${problems.length} problems`} live>
            <ul className="space-y-1">
              {problems.slice(0, 20).map((problem) => <li key={`${problem.path} ${problem.message}`}>{problem.path === "" ? null : <code className="num mr-2 text-ink">{problem.path}</code>}{problem.message}</li>)}
            </ul>
          </Notice>
        )}
      </div>
    </DialogBox>
  );
}
