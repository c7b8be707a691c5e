"use client";
import { useRouter } from "next/navigation";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { useToast } from "@/components/ui/ToastProvider";
import { useMaterials } from "@/lib/queries/materials";
import { useCreatePart } from "@/lib/queries/parts";
import { startDraft } from "../draft/startDraft";
import { PartEditor } from "./PartEditor";
import { SaveProblem } from "./SaveProblem";
import { problemsOfSave } from "./problemsOfSave";
import { useStoredDraft } from "./useStoredDraft";

export function NewPart() {
  const materials = useMaterials();
  if (materials.isPending) return <Loading what="the materials" />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  return <NewPartForm materials={materials.data} />;
}

function NewPartForm({ materials }: { readonly materials: readonly MaterialFacts[] }) {
  const router = useRouter();
  const toast = useToast();
  const create = useCreatePart();
  const usual = materials.find(({ id }) => id === "S235") ?? materials[0];
  const store = useStoredDraft("new", 0, () => startDraft(usual?.id ?? ""));
  return (
    <PartEditor title={store.draft.name.trim() === "" ? "New part" : store.draft.name} materials={materials} store={store} isNew saving={create.isPending || create.isSuccess}
      refused={problemsOfSave(create.error)} message={create.error === null ? null : <SaveProblem error={create.error} />}
      onChange={() => { if (create.isError) create.reset(); }}
      onSave={(draft, document) => create.mutate(
        { document, note: draft.note, ...(draft.number.trim() === "" ? {} : { number: draft.number.trim() }) },
        { onSuccess: (part) => { store.forget(); toast("good", "Part saved", `${part.number}, revision ${part.revision.revision}`); router.push(`/parts/${part.id}`); } },
      )} />
  );
}
