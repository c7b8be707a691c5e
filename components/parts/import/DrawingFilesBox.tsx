"use client";
import { useId, useState, type DragEvent } from "react";
import { classes } from "@/components/ui/classes";
import { TextLink } from "@/components/ui/TextLink";
import { Notice } from "@/components/ui/Notice";

/** Chooses one or many drawings, by dialog or by dropping them. */
export function DrawingFilesBox({ onFiles }: { readonly onFiles: (files: readonly File[]) => void }) {
  const id = useId();
  const [over, setOver] = useState(false);
  const [other, setOther] = useState<string | null>(null);
  const take = (files: FileList | null) => {
    const all = [...(files ?? [])];
    const drawings = all.filter(({ name }) => /\.dxf$/i.test(name));
    setOther(all.find((file) => !drawings.includes(file))?.name ?? null);
    if (drawings.length > 0) onFiles(drawings);
  };
  const drop = (event: DragEvent) => { event.preventDefault(); setOver(false); take(event.dataTransfer.files); };
  return (
    <div className="max-w-3xl space-y-3">
      <div onDragOver={(event) => { event.preventDefault(); setOver(true); }} onDragLeave={() => setOver(false)} onDrop={drop}
        className={classes("border-2 border-dashed p-6", over ? "border-accent bg-accent-wash" : "border-rule-strong bg-sheet")}>
        <label htmlFor={id} className="mb-2 block font-medium">Drawings of flats, one part a file</label>
        <input id={id} type="file" multiple accept=".dxf" aria-describedby={`${id}-hint`} onChange={(event) => { take(event.target.files); event.target.value = ""; }}
          className="block w-full text-sm file:mr-3 file:min-h-9 file:rounded file:border file:border-rule-strong file:bg-sheet file:px-3 file:font-medium" />
        <p id={`${id}-hint`} className="mt-2 text-sm text-ink-faint">.dxf as text (any version from R12), up to 50 MB each. Or drop them here. They are read in this browser; only what you save goes to the server.</p>
      </div>
      {other === null ? null : (
        <Notice tone="wrong" title={`${other} is no DXF file`} live>
          {/\.(stp|step|p21)$/i.test(other) ? <p>A folded part as a solid is read by <TextLink href="/parts/import-step">Import a STEP file</TextLink>.</p> : "Save the drawing as DXF (ASCII) in the program that it comes from."}
        </Notice>
      )}
    </div>
  );
}
