"use client";
import { useRef, useState } from "react";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { TextLink } from "@/components/ui/TextLink";
import { useMaterials } from "@/lib/queries/materials";
import { useReadStep } from "@/lib/queries/stepReadings";
import { BodyChoice } from "./BodyChoice";
import { FoundPart } from "./FoundPart";
import { ReadingFile } from "./ReadingFile";
import { StepFileBox } from "./StepFileBox";

/** From a folded part's STEP file to a part of the register: choose, read, look it over, save. */
export function ImportStep() {
  const materials = useMaterials();
  const reading = useReadStep();
  const [file, setFile] = useState<File | null>(null);
  const [stopped, setStopped] = useState(false);
  const breakOff = useRef<AbortController | null>(null);
  const read = (chosen: File, body?: number) => {
    breakOff.current?.abort();
    const controller = new AbortController();
    breakOff.current = controller;
    setFile(chosen);
    setStopped(false);
    reading.mutate({ file: chosen, signal: controller.signal, ...(body === undefined ? {} : { body }) });
  };
  const stop = () => {
    breakOff.current?.abort();
    reading.reset();
    setStopped(true);
  };
  const found = reading.data;
  if (materials.isPending) return <Loading what="the materials" />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  if (file !== null && found?.kind === "part") {
    return <FoundPart key={`${file.name} ${file.lastModified} ${reading.variables?.body ?? 0}`} fileName={file.name} part={found.part} mesh={found.mesh} materials={materials.data} onAnother={() => { reading.reset(); setFile(null); }} />;
  }
  return (
    <>
      <PageHeader kicker="New part" title="Import a STEP file" summary="The folded part as a solid. Its thickness, faces, bends and holes are recognised, and it is unfolded with this shop’s own rules."
        actions={<TextLink href="/parts/import">Import drawings instead</TextLink>} />
      <div className="max-w-3xl space-y-5">
        {reading.isPending && file !== null ? <ReadingFile file={file} onStop={stop} /> : <StepFileBox onFile={(chosen) => read(chosen)} />}
        {stopped ? <Notice tone="note" title="Reading was stopped" live>Nothing was kept. Choose the file again, or another.</Notice> : null}
        {reading.isError && !stopped ? <Notice tone="wrong" title={`${file?.name ?? "The file"} cannot be imported`} live>{reading.error.message}</Notice> : null}
        {found?.kind === "choose" && file !== null ? <BodyChoice message={found.message} bodies={found.bodies} onChoose={(body) => read(file, body)} /> : null}
      </div>
    </>
  );
}
