"use client";
import { useMemo, useState, type ReactNode } from "react";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { Loading } from "@/components/ui/Loading";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { importChoicesOf } from "./importChoicesOf";
import { startImportForm, type ImportForm } from "./importForm";
import { ReadDrawing } from "./ReadDrawing";
import { readRememberedImport } from "./rememberedImport";
import { useDrawing } from "./useDrawing";

interface ImportDrawingProps {
  readonly file: File;
  readonly materials: readonly MaterialFacts[];
  /** The files chosen. */
  readonly list: ReactNode;
  /** "2 of 7". */
  readonly count: string | null;
  /** What was chosen for this file before it was left for another. */
  readonly kept: ImportForm | null;
  readonly onKeep: (form: ImportForm) => void;
  readonly onSaved: (part: { readonly id: string; readonly number: string }) => void;
  readonly onSkip: () => void;
}

/** One drawing: read, looked over, saved. */
export function ImportDrawing({ file, materials, list, count, kept, onKeep, onSaved, onSkip }: ImportDrawingProps) {
  const [typed, setTyped] = useState(kept);
  const [choices, setChoices] = useState(kept === null ? null : importChoicesOf(kept));
  const { facts, found, failed } = useDrawing(file, choices);
  const start = useMemo(() => (facts === null ? null : startImportForm(facts, file.name, materials, readRememberedImport())), [facts, file, materials]);
  const form = typed ?? start;
  if (start !== null && choices === null) setChoices(importChoicesOf(start));
  const change = (next: ImportForm) => {
    setTyped(next);
    onKeep(next);
    const drawn: readonly (keyof ImportForm)[] = ["unit", "roles", "gap", "singleLines", "contour"];
    if (form !== null && drawn.some((key) => next[key] !== form[key])) setChoices(importChoicesOf(next));
  };
  const kicker = count === null ? "Import drawing" : `Import drawing ${count}`;
  if (failed !== null || facts === null || found === null || form === null) {
    return (
      <>
        <PageHeader kicker={kicker} title={file.name} actions={<Button look="plain" onClick={onSkip}>Leave this file out</Button>} />
        {list}
        {failed === null ? <Loading what={file.name} /> : <Notice tone="wrong" title={`${file.name} cannot be imported`} live><p>{failed.charAt(0).toUpperCase() + failed.slice(1)}.</p></Notice>}
      </>
    );
  }
  return <ReadDrawing file={file} materials={materials} kicker={kicker} list={list} facts={facts} found={found} form={form} onForm={change} onSaved={onSaved} onSkip={onSkip} />;
}
