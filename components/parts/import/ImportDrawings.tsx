"use client";
import { useState } from "react";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { TextLink } from "@/components/ui/TextLink";
import { useMaterials } from "@/lib/queries/materials";
import { DrawingFilesBox } from "./DrawingFilesBox";
import { FileQueue, type QueuedFile } from "./FileQueue";
import { ImportDrawing } from "./ImportDrawing";
import type { ImportForm } from "./importForm";

/** From DXF files to parts of the register, one after the other. */
export function ImportDrawings() {
  const materials = useMaterials();
  const [queue, setQueue] = useState<readonly QueuedFile[]>([]);
  const [current, setCurrent] = useState(0);
  /** What was chosen and typed, by file, so that going to another file loses nothing. */
  const [kept] = useState(() => new Map<string, ImportForm>());
  if (materials.isPending) return <Loading what="the materials" />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  const shown = queue[current];
  const add = (files: readonly File[]) => {
    setQueue([...queue, ...files.map((file, i): QueuedFile => ({ key: `${queue.length + i} ${file.name}`, file, state: "waiting", part: null }))]);
    if (shown === undefined || shown.state !== "waiting") setCurrent(queue.length);
  };
  const settle = (change: Partial<QueuedFile>) => {
    const settled = queue.map((one, i) => (i === current ? { ...one, ...change } : one));
    const after = [...settled.keys()].map((i) => (current + 1 + i) % settled.length).find((i) => settled[i]?.state === "waiting");
    setQueue(settled);
    setCurrent(after ?? settled.length);
  };
  const list = queue.length === 0 ? null : <FileQueue queue={queue} current={current} onChoose={setCurrent} onFiles={add} />;
  if (shown === undefined || shown.state === "saved") {
    const saved = queue.filter(({ state }) => state === "saved").length;
    return (
      <>
        <PageHeader kicker="New parts" title="Import drawings" summary={saved > 0 ? `${saved} of ${queue.length} saved as parts.` : "Flats with bend lines as DXF: their contours are closed and mended, their bend lines found; you say what the drawing does not."}
          actions={<TextLink href="/parts/import-step">Import a STEP file instead</TextLink>} />
        <div className="space-y-5">
          {list}
          <DrawingFilesBox onFiles={add} />
        </div>
      </>
    );
  }
  return (
    <ImportDrawing key={shown.key} file={shown.file} materials={materials.data} list={list} count={queue.length > 1 ? `${current + 1} of ${queue.length}` : null}
      kept={kept.get(shown.key) ?? null} onKeep={(form) => { kept.set(shown.key, form); }}
      onSaved={(part) => settle({ state: "saved", part })} onSkip={() => settle({ state: "left" })} />
  );
}
