"use client";
import { FileUp, ListChecks } from "lucide-react";
import { useId, useRef, useState, type DragEvent } from "react";
import { Button } from "../Button";
import { classes } from "../classes";
import { TextArea } from "../TextArea";
import { readTextFile, type TextFile } from "./readTextFile";
import type { ColumnNote } from "@/lib/csv/columnNotes";

export interface ImportText extends TextFile {
  readonly fileName: string;
}

interface ImportSourceProps {
  readonly what: string;
  readonly columns: readonly ColumnNote[];
  readonly source: ImportText;
  readonly busy: boolean;
  readonly onChange: (source: ImportText) => void;
  readonly onAsk: (source: ImportText) => void;
  readonly onCancel?: () => void;
}

/** Where the table comes from: a file, dropped or chosen, or pasted text; and which columns it may have. */
export function ImportSource({ what, columns, source, busy, onChange, onAsk, onCancel }: ImportSourceProps) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const take = async (file: File | undefined) => { if (file !== undefined) onAsk({ ...(await readTextFile(file)), fileName: file.name }); };
  const drop = (event: DragEvent) => { event.preventDefault(); setOver(false); void take(event.dataTransfer.files[0]); };
  return (
    <div className="space-y-4">
      <div onDragOver={(event) => { event.preventDefault(); setOver(true); }} onDragLeave={() => setOver(false)} onDrop={drop}
        className={classes("flex flex-wrap items-center gap-3 border border-dashed px-4 py-4", over ? "border-accent bg-accent-wash" : "border-rule-strong")}>
        <input ref={input} id={`${id}-file`} type="file" aria-label={`CSV file of ${what}`} accept=".csv,.txt,.tsv,text/csv,text/tab-separated-values" className="sr-only" tabIndex={-1}
          onChange={(event) => { void take(event.target.files?.[0]); event.target.value = ""; }} />
        <Button look="plain" icon={<FileUp aria-hidden />} busy={busy} onClick={() => input.current?.click()}>Choose a CSV file</Button>
        <p className="text-ink-soft">or drop it here, or paste the lines below. Nothing is written before you have seen what each line would do.</p>
      </div>
      <TextArea id={`${id}-text`} label={`Lines of ${what}, the headings first`} rows={8} numbers wrap="off" spellCheck={false} value={source.text}
        onChange={(event) => onChange({ text: event.target.value, fileName: "" })} />
      <div className="flex flex-wrap gap-2">
        <Button icon={<ListChecks aria-hidden />} busy={busy} disabled={source.text.trim() === ""} onClick={() => onAsk(source)}>See what it would do</Button>
        {onCancel === undefined ? null : <Button look="plain" onClick={onCancel}>Cancel</Button>}
      </div>
      <details className="border-t border-rule pt-3">
        <summary className="font-medium text-ink-soft">Which columns may stand in it</summary>
        <div className="mt-2 space-y-3 text-sm text-ink-soft">
          <p>Parted by commas, semicolons or tabs; in any order; with semicolons or tabs, decimals may have a comma. A column that is left out changes nothing; an empty cell empties a value that may be empty.</p>
          <ul className="grid gap-x-8 md:grid-cols-2">
            {columns.map(({ heading, expects, required }) => (
              <li key={heading} className="border-b border-rule py-1"><span className="num text-ink">{heading}</span>{required ? " (must be there)" : ""}: {expects}</li>
            ))}
          </ul>
        </div>
      </details>
    </div>
  );
}
