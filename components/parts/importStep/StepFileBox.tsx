"use client";
import { useState, type DragEvent } from "react";
import { classes } from "@/components/ui/classes";
import { Notice } from "@/components/ui/Notice";

const mostBytes = 50_000_000;

/** Chooses a STEP file, by dialog or by dropping it. */
export function StepFileBox({ onFile }: { readonly onFile: (file: File) => void }) {
  const [over, setOver] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const take = (file: File | undefined) => {
    if (file === undefined) return;
    const tooLarge = file.size > mostBytes;
    setProblem(tooLarge ? `${file.name} has ${(file.size / 1e6).toFixed(1)} MB; at most 50 MB are read. Export the one part alone, without its assembly.` : null);
    if (!tooLarge) onFile(file);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files[0]);
  };
  return (
    <div className="space-y-3">
      <div onDragOver={(event) => { event.preventDefault(); setOver(true); }} onDragLeave={() => setOver(false)} onDrop={drop}
        className={classes("border-2 border-dashed p-6", over ? "border-accent bg-accent-wash" : "border-rule-strong bg-sheet")}>
        <label htmlFor="step-file" className="mb-2 block font-medium">STEP file of one folded part</label>
        <input id="step-file" type="file" accept=".stp,.step,.p21" aria-describedby="step-file-hint"
          onChange={(event) => { take(event.target.files?.[0]); event.target.value = ""; }}
          className="block w-full text-sm file:mr-3 file:min-h-9 file:rounded file:border file:border-rule-strong file:bg-sheet file:px-3 file:font-medium" />
        <p id="step-file-hint" className="mt-2 text-sm text-ink-faint">.stp or .step (AP203, AP214, AP242), up to 50 MB, one solid body of one thickness. Or drop it here.</p>
      </div>
      {problem === null ? null : <Notice tone="wrong" title="The file is too large" live>{problem}</Notice>}
    </div>
  );
}
