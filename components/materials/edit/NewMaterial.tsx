"use client";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { PageHeader } from "@/components/ui/PageHeader";
import { Select } from "@/components/ui/Select";
import { useToast } from "@/components/ui/ToastProvider";
import { useCreateMaterial, useMaterials } from "@/lib/queries/materials";
import { emptyMaterialDraft, materialDraft, type MaterialDraft } from "./materialDraft";
import { MaterialForm } from "./MaterialForm";

/** A new material, from nothing or from one that is like it. */
export function NewMaterial() {
  const router = useRouter();
  const toast = useToast();
  const create = useCreateMaterial();
  const materials = useMaterials();
  const [like, setLike] = useState("none");
  /** The values of another; the names stay as typed. */
  const take = (next: string, { id, name, designation }: MaterialDraft): MaterialDraft => {
    setLike(next);
    const model = materials.data?.find((one) => one.id === next);
    return { ...(model === undefined ? emptyMaterialDraft : materialDraft(model)), id, name, designation };
  };
  return (
    <>
      <PageHeader kicker="New material" title="Add a material" summary="Every value says where it is from: a standard, the shop’s own measurement, or somebody’s memory." />
      <MaterialForm start={emptyMaterialDraft} base={null} busy={create.isPending || create.isSuccess} error={create.error} onCancel={() => router.push("/materials")}
        lead={(draft, change) => (
          <div className="max-w-sm">
            <Select id="material-like" label="Take the values of" value={like} onChange={(next) => change(take(next, draft))} options={[{ value: "none", label: "None: all to be typed" }, ...(materials.data ?? []).map(({ id, name }) => ({ value: id, label: id, note: name }))]} />
          </div>
        )}
        onSave={(facts, note) => create.mutate({ facts, note }, { onSuccess: () => { toast("good", "Material added", facts.id); router.push(`/materials/${encodeURIComponent(facts.id)}`); } })} />
    </>
  );
}
