"use client";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { PageHeader } from "@/components/ui/PageHeader";
import { Select } from "@/components/ui/Select";
import { useToast } from "@/components/ui/ToastProvider";
import { useCreateMaterial, useMaterials } from "@/lib/queries/materials";
import { emptyMaterialDraft, materialDraft } from "./materialDraft";
import { MaterialForm } from "./MaterialForm";

/** A new material, from nothing or from one that is like it. */
export function NewMaterial() {
  const router = useRouter();
  const toast = useToast();
  const create = useCreateMaterial();
  const materials = useMaterials();
  const [like, setLike] = useState("none");
  const model = materials.data?.find(({ id }) => id === like);
  const start = model === undefined ? emptyMaterialDraft : { ...materialDraft(model), id: "", name: "", designation: "" };
  return (
    <>
      <PageHeader kicker="New material" title="Add a material" summary="Every value says where it is from: a standard, the shop’s own measurement, or somebody’s memory." />
      <div className="mb-8 max-w-sm">
        <Select id="material-like" label="Start with the values of" value={like} onChange={setLike} options={[{ value: "none", label: "Nothing: all to be typed" }, ...(materials.data ?? []).map(({ id, name }) => ({ value: id, label: id, note: name }))]} />
      </div>
      <MaterialForm key={like} start={start} base={null} busy={create.isPending || create.isSuccess} error={create.error} onCancel={() => router.push("/materials")}
        onSave={(facts, note) => create.mutate({ facts, note }, { onSuccess: () => { toast("good", "Material added", facts.id); router.push(`/materials/${encodeURIComponent(facts.id)}`); } })} />
    </>
  );
}
