"use client";
import Link from "next/link";
import { useRouter } from "next/navigation";
import type { MaterialFacts } from "@/bending/handbook/material";
import { Button } from "@/components/ui/Button";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { useToast } from "@/components/ui/ToastProvider";
import { ApiProblem } from "@/lib/queries/apiProblem";
import { useMaterials } from "@/lib/queries/materials";
import { useAddRevision, usePart } from "@/lib/queries/parts";
import type { PartDetail } from "@/lib/schemas/views";
import { draftFromDocument } from "../draft/draftFromDocument";
import { PartEditor } from "./PartEditor";
import { problemsOfSave } from "./problemsOfSave";
import { SaveProblem } from "./SaveProblem";
import { useStoredDraft } from "./useStoredDraft";
import { WaitingToSave } from "./WaitingToSave";

export function EditPart({ id }: { readonly id: string }) {
  const materials = useMaterials();
  const part = usePart(id);
  if (materials.isPending || part.isPending) return <Loading what="the part" />;
  if (part.isError) return <LoadProblem what="The part" error={part.error} onRetry={() => void part.refetch()} />;
  if (materials.isError) return <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} />;
  return <EditPartForm part={part.data} materials={materials.data} newest={async () => (await part.refetch()).data?.revisions[0]?.revision} />;
}

interface EditPartFormProps {
  readonly part: PartDetail;
  readonly materials: readonly MaterialFacts[];
  readonly newest: () => Promise<number | undefined>;
}

function EditPartForm({ part, materials, newest }: EditPartFormProps) {
  const router = useRouter();
  const toast = useToast();
  const add = useAddRevision(part.id);
  const store = useStoredDraft(part.id, part.revision.revision, () => draftFromDocument(part.document, part.number));
  const stale = add.error instanceof ApiProblem && add.error.status === 409;
  const goOn = async () => { const to = await newest(); if (to !== undefined) { store.setBasedOn(to); add.reset(); } };
  return (
    <PartEditor title={`${part.number} ${store.draft.name}`} materials={materials} store={store} isNew={false} saving={add.isPending || add.isSuccess}
      refused={problemsOfSave(add.error)} onChange={() => { if (add.isError && !stale) add.reset(); }}
      message={add.isPaused ? <WaitingToSave /> : add.error === null ? null : (
        <SaveProblem error={add.error}>
          {stale ? (
            <>
              <p><Link href={`/parts/${part.id}`} target="_blank" className="text-accent-ink underline underline-offset-2">See the newest revision</Link> in another tab, then decide.</p>
              <Button look="plain" size="small" onClick={() => void goOn()}>Keep mine: save it after the newest</Button>
            </>
          ) : null}
        </SaveProblem>
      )}
      onSave={(draft, document) => add.mutate({ basedOn: store.basedOn, document, note: draft.note }, {
        onSuccess: (saved) => { store.forget(); toast("good", "Revision saved", `${saved.number}, revision ${saved.revision.revision}`); router.push(`/parts/${saved.id}`); },
      })} />
  );
}
