"use client";
import { useRouter } from "next/navigation";
import { useMemo, useState, type FormEvent } from "react";
import type { RecognisedPart } from "@/bending/exchange/step/recognisedPart";
import type { SolidMesh } from "@/bending/exchange/step/solidMesh";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { Panel } from "@/components/ui/Panel";
import { useToast } from "@/components/ui/ToastProvider";
import { formatLength } from "@/lib/format/formatLength";
import { formatNumber } from "@/lib/format/formatNumber";
import { useCreatePart } from "@/lib/queries/parts";
import { useShopTable } from "@/lib/queries/shopTable";
import { FlatDrawing } from "../drawing/FlatDrawing";
import { FlatFacts } from "../drawing/FlatFacts";
import { FoundBends } from "./FoundBends";
import { FoundSolid } from "./FoundSolid";
import { importedModel } from "./importedModel";
import { ImportFields } from "./ImportFields";
import { startImportForm, type ImportForm } from "./importForm";
import { LeftOutList } from "./LeftOutList";

interface FoundPartProps {
  readonly fileName: string;
  readonly part: RecognisedPart;
  readonly mesh: SolidMesh;
  readonly materials: readonly MaterialFacts[];
  readonly onAnother: () => void;
}

/** What was recognised, to be looked over, rounded and saved. */
export function FoundPart({ fileName, part, mesh, materials, onAnother }: FoundPartProps) {
  const router = useRouter();
  const toast = useToast();
  const create = useCreatePart();
  const usual = materials.find(({ id }) => id === "S235") ?? materials[0];
  const [form, setForm] = useState<ImportForm>(() => startImportForm(part, fileName, usual?.id ?? ""));
  const { data: shopTable } = useShopTable(form.material);
  const [marked, setMarked] = useState<readonly number[]>([]);
  const { model, problems } = useMemo(() => importedModel(part, form, materials, shopTable), [part, form, materials, shopTable]);
  const problemAt = (path: string) => problems.find((problem) => problem.path === path)?.message;
  const change = (next: Partial<ImportForm>) => setForm((old) => ({ ...old, ...next }));
  const save = (event: FormEvent) => {
    event.preventDefault();
    if (model === null) return;
    create.mutate(
      { document: model.document, note: `From ${fileName}`, ...(form.number.trim() === "" ? {} : { number: form.number.trim() }) },
      { onSuccess: (saved) => { toast("good", "Part saved", `${saved.number}, revision ${saved.revision.revision}`); router.push(`/parts/${saved.id}`); } },
    );
  };
  const elsewhere = problems.filter(({ path }) => !/^(name|thickness|bends\.\d+\.(insideRadius|angle))$/.test(path));
  return (
    <form onSubmit={save} noValidate>
      <PageHeader kicker="Import a STEP file" title={fileName}
        facts={[
          { label: "Thickness", value: <span className="num">{formatLength(part.thickness, "mm")}</span> },
          { label: "Bends", value: <span className="num">{part.bends.length}</span> },
          { label: "Faces of the sheet", value: <span className="num">{part.plates.length}</span> },
          { label: "Of the solid understood", value: <span className="num">{understood(part)}</span> },
          ...(model === null ? [] : [{ label: "Folds back within", value: <span className="num">{within(model.folded.farthest)}</span> }]),
        ]}
        actions={<><Button look="plain" onClick={onAnother}>Another file</Button><Button type="submit" busy={create.isPending || create.isSuccess} disabled={model === null}>Save part</Button></>} />
      <div className="grid grid-cols-1 gap-8 xl:grid-cols-[minmax(0,5fr)_minmax(0,6fr)]">
        <div className="min-w-0 space-y-6">
          {create.error === null ? null : <Notice tone="wrong" title="Nothing was saved; what you entered is still here" live>{create.error.message}</Notice>}
          <Panel title="Part"><ImportFields form={form} materials={materials} problemAt={problemAt} numberProblem={create.error?.message} onChange={change} /></Panel>
          <Panel title="Bends" aside="as found; round them to what will be bent">
            <FoundBends part={part} model={model} form={form} problemAt={problemAt} onChange={(bends) => change({ bends })} onMark={setMarked} marked={marked} />
          </Panel>
          {elsewhere.length === 0 ? null : (
            <Notice tone="wrong" title="The part cannot be made as it stands" live>
              <ul className="list-disc pl-5">{elsewhere.slice(0, 10).map(({ path, message }) => <li key={`${path} ${message}`}><code className="num mr-2 text-ink">{path}</code>{message}</li>)}</ul>
            </Notice>
          )}
        </div>
        <div className="min-w-0 space-y-6">
          <FoundSolid part={part} mesh={mesh} model={model} marked={marked} />
          <LeftOutList part={part} marked={marked} onMark={setMarked} />
          {model === null ? null : <div className="space-y-3"><FlatFacts part={model.part} flat={model.flat} units="mm" /><FlatDrawing flat={model.flat} units="mm" /></div>}
        </div>
      </div>
    </form>
  );
}

function understood({ volume, solidVolume }: RecognisedPart): string {
  const part = (volume / solidVolume) * 100;
  return Math.abs(part - 100) < 0.005 ? "all" : `${part.toFixed(part > 99 ? 2 : 1)} %`;
}

/** A distance in mm, rounded up to a thousandth. */
const within = (distance: number): string => `${formatNumber(Math.max(0.001, Math.ceil(distance * 1000) / 1000), 3)} mm`;
