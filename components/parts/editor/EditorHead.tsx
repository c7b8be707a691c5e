"use client";
import { FileDown, FileUp, Redo2, RotateCcw, Save, Undo2 } from "lucide-react";
import { useState } from "react";
import type { PartDocument } from "@/bending/part/partDocument";
import { Button } from "@/components/ui/Button";
import { IconButton } from "@/components/ui/IconButton";
import { PageHeader } from "@/components/ui/PageHeader";
import { ImportDialog } from "./ImportDialog";
import { saveAsFile } from "./saveAsFile";

interface EditorHeadProps {
  readonly title: string;
  readonly isNew: boolean;
  readonly saving: boolean;
  readonly changed: boolean;
  readonly document: PartDocument | null;
  readonly onImport: (document: PartDocument) => void;
  /** Takes the last change back; null when there is none. */
  readonly onUndo: (() => void) | null;
  /** Brings back what was taken back last; null when there is none. */
  readonly onRedo: (() => void) | null;
  readonly onStartAgain: () => void;
}

export function EditorHead({ title, isNew, saving, changed, document, onImport, onUndo, onRedo, onStartAgain }: EditorHeadProps) {
  const [importing, setImporting] = useState(false);
  return (
    <>
      <PageHeader kicker={isNew ? "New part" : "New revision"} title={title} actions={(
        <>
          <IconButton label="Undo (Ctrl+Z)" disabled={onUndo === null} onClick={() => onUndo?.()}><Undo2 aria-hidden /></IconButton>
          <IconButton label="Redo (Ctrl+Y)" disabled={onRedo === null} onClick={() => onRedo?.()}><Redo2 aria-hidden /></IconButton>
          {changed ? <Button look="quiet" size="small" icon={<RotateCcw aria-hidden />} onClick={onStartAgain}>Throw away my changes</Button> : null}
          <Button look="plain" icon={<FileUp aria-hidden />} onClick={() => setImporting(true)}>Import</Button>
          <Button look="plain" icon={<FileDown aria-hidden />} disabled={document === null}
            onClick={() => { if (document !== null) saveAsFile(`${document.name.trim() || "part"}.json`, JSON.stringify(document, null, 2)); }}>Export</Button>
          <Button type="submit" busy={saving} icon={<Save aria-hidden />}>{isNew ? "Save part" : "Save revision"}</Button>
        </>
      )} />
      <ImportDialog open={importing} onOpenChange={setImporting} onDocument={onImport} />
    </>
  );
}
