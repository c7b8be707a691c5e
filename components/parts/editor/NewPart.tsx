"use client";
import { useRouter } from "next/navigation";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { useToast } from "@/components/ui/ToastProvider";
import { useMaterials } from "@/lib/queries/materials";
import { useCreatePart, usePart } from "@/lib/queries/parts";
import { draftFromDocument } from "../draft/draftFromDocument";
import type { PartDraft } from "../draft/partDraft";
import { startDraft } from "../draft/startDraft";
import { PartEditor } from "./PartEditor";
import { SaveProblem } from "./SaveProblem";
import { problemsOfSave } from "./problemsOfSave";
import { useStoredDraft } from "./useStoredDraft";
import { WaitingToSave } from "./WaitingToSave";

interface PartToCopy { readonly id: string; readonly revision: number | undefined }

/** A part from nothing, or from a copy of the one that `copyOf` names. */
export function NewPart({ copyOf }: { readonly copyOf: PartToCopy | null }) {
  const materials = useMaterials();
  if (materials.isPending) return <Loading what="the materials" />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  if (copyOf !== null) return <CopiedPart {...copyOf} materials={materials.data} />;
  const offered = materials.data.filter(({ withdrawn }) => withdrawn === null);
  const usual = offered.find(({ id }) => id === "S235") ?? offered[0];
  return <NewPartForm name="new" start={() => startDraft(usual?.id ?? "")} materials={materials.data} />;
}

function CopiedPart({ id, revision, materials }: PartToCopy & { readonly materials: readonly MaterialFacts[] }) {
  const part = usePart(id, revision);
  if (part.isPending) return <Loading what="the part" />;
  if (part.isError) return <LoadProblem what="The part" error={part.error} onRetry={() => void part.refetch()} />;
  const { data } = part;
  return <NewPartForm name={`copy of ${id} r${data.revision.revision}`} materials={materials} start={() => ({ ...draftFromDocument(data.document), name: `${data.name} copy`, note: `Copy of ${data.number}, revision ${data.revision.revision}` })} />;
}

interface NewPartFormProps {
  /** What the unsaved entries are kept under. */
  readonly name: string;
  readonly start: () => PartDraft;
  readonly materials: readonly MaterialFacts[];
}

function NewPartForm({ name, start, materials }: NewPartFormProps) {
  const router = useRouter();
  const toast = useToast();
  const create = useCreatePart();
  const store = useStoredDraft(name, 0, start);
  return (
    <PartEditor title={store.draft.name.trim() === "" ? "New part" : store.draft.name} materials={materials} store={store} isNew saving={create.isPending || create.isSuccess}
      refused={problemsOfSave(create.error)} message={create.isPaused ? <WaitingToSave /> : create.error === null ? null : <SaveProblem error={create.error} />}
      onChange={() => { if (create.isError) create.reset(); }}
      onSave={(draft, document) => create.mutate(
        { document, note: draft.note, ...(draft.number.trim() === "" ? {} : { number: draft.number.trim() }) },
        { onSuccess: (part) => { store.forget(); toast("good", "Part saved", `${part.number}, revision ${part.revision.revision}`); router.push(`/parts/${part.id}`); } },
      )} />
  );
}
