"use client";
import { Pencil } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { Panel } from "@/components/ui/Panel";
import { TextLink } from "@/components/ui/TextLink";
import { useToast } from "@/components/ui/ToastProvider";
import { useMaterial, useUpdateMaterial } from "@/lib/queries/materials";
import type { MaterialDetail } from "@/lib/schemas/materialViews";
import { materialDraft } from "../edit/materialDraft";
import { MaterialForm } from "../edit/MaterialForm";
import { ValueTable } from "./ValueTable";
import { VersionHistory } from "./VersionHistory";
import { WithdrawMaterial } from "./WithdrawMaterial";

export function MaterialPage({ id, mayWrite }: { readonly id: string; readonly mayWrite: boolean }) {
  const found = useMaterial(id);
  const [editing, setEditing] = useState<MaterialDetail | null>(null);
  if (found.isPending) return <Loading what="the material" />;
  if (found.isError) return <LoadProblem what="The material" error={found.error} onRetry={() => void found.refetch()} />;
  const { material, parts } = found.data;
  return (
    <>
      <PageHeader kicker="Material" title={material.id} summary={material.name} facts={headFacts(found.data)}
        actions={mayWrite && editing === null ? <><WithdrawMaterial detail={found.data} /><Button icon={<Pencil aria-hidden />} onClick={() => setEditing(found.data)}>Change values</Button></> : null} />
      {material.withdrawn === null ? null : (
        <div className="mb-6"><Notice tone="caution" title="Withdrawn: not offered for new parts">{material.withdrawn.by === "" ? null : `By ${material.withdrawn.by}. `}{parts === 0 ? "No part is made of it." : parts === 1 ? "One part is made of it and keeps working." : `${parts} parts are made of it and keep working.`}</Notice></div>
      )}
      {editing === null
        ? (
          <div className="grid grid-cols-1 gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(0,28rem)]">
            <Panel title="Values" aside={parts === 0 ? undefined : <TextLink href={`/parts?material=${encodeURIComponent(id)}`}>{parts === 1 ? "1 part" : `${parts} parts`} of it</TextLink>}><ValueTable facts={material} /></Panel>
            <VersionHistory detail={found.data} />
          </div>
        )
        : <EditMaterial detail={editing} newest={material.version} onDone={() => setEditing(null)} />}
    </>
  );
}

/** Changes the version that was open when editing began; `newest` may be another by now. */
function EditMaterial({ detail: { material }, newest, onDone }: { readonly detail: MaterialDetail; readonly newest: number; readonly onDone: () => void }) {
  const toast = useToast();
  const update = useUpdateMaterial(material.id);
  const stale = newest > material.version && !update.isSuccess;
  return (
    <div className="space-y-6">
      {stale ? <Notice tone="caution" title={`Version ${newest} was saved while you were changing version ${material.version}`}>{seeTheirs(material.id)}</Notice> : null}
      <MaterialForm start={materialDraft(material)} base={material} busy={update.isPending} error={update.error} onCancel={onDone} onConflict={stale ? undefined : seeTheirs(material.id)}
        onSave={(facts, note) => update.mutate({ basedOn: material.version, facts, note }, { onSuccess: (saved) => { toast("good", "Saved", `${facts.id}, version ${saved.material.version}`); onDone(); } })} />
    </div>
  );
}

const seeTheirs = (id: string) => <p><a href={`/materials/${encodeURIComponent(id)}`} target="_blank" rel="noreferrer" className="font-medium text-accent-ink underline underline-offset-2">See the newest version in a new window</a>, then make your change there.</p>;

function headFacts({ material }: MaterialDetail) {
  return [
    { label: "Designation", value: material.designation },
    { label: "Standard", value: material.standard },
    { label: "Group", value: material.group },
    { label: "Version", value: <span className="num">{material.version}</span> },
    { label: "Changed", value: <><span className="num">{material.changedAt.slice(0, 10)}</span>{material.changedBy === "" ? "" : ` ${material.changedBy}`}</> },
  ];
}
