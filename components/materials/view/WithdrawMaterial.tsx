"use client";
import { Archive, ArchiveRestore } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { TextArea } from "@/components/ui/TextArea";
import { useToast } from "@/components/ui/ToastProvider";
import { useWithdrawMaterial } from "@/lib/queries/materials";
import type { MaterialDetail } from "@/lib/schemas/materialViews";

/** Withdraws a material after asking, or brings it back at once. */
export function WithdrawMaterial({ detail: { material, parts } }: { readonly detail: MaterialDetail }) {
  const [asking, setAsking] = useState(false);
  const [note, setNote] = useState("");
  const toast = useToast();
  const withdraw = useWithdrawMaterial(material.id);
  const send = (withdrawn: boolean) => withdraw.mutate({ withdrawn, note: note.trim() }, {
    onSuccess: () => { setAsking(false); setNote(""); toast("good", withdrawn ? "Material withdrawn" : "Material is back in use", material.id); },
  });
  if (material.withdrawn !== null) {
    return (
      <>
        <Button look="plain" icon={<ArchiveRestore aria-hidden />} busy={withdraw.isPending} onClick={() => send(false)}>Bring back</Button>
        {withdraw.error === null ? null : <Notice tone="wrong" title="It was not brought back" live>{withdraw.error.message}</Notice>}
      </>
    );
  }
  return (
    <>
      <Button look="plain" icon={<Archive aria-hidden />} onClick={() => setAsking(true)}>Withdraw</Button>
      <DialogBox open={asking} onOpenChange={setAsking} title={`Withdraw ${material.id}?`}
        description={<>It is no longer offered for new parts. {parts === 0 ? "No part is made of it now." : parts === 1 ? "The one part that is made of it keeps working." : `The ${parts} parts that are made of it keep working.`} It can be brought back.</>}
        actions={<><Button look="plain" onClick={() => setAsking(false)}>Cancel</Button><Button look="danger" busy={withdraw.isPending} onClick={() => send(true)}>Withdraw</Button></>}>
        <div className="space-y-3">
          {withdraw.error === null ? null : <Notice tone="wrong" title="It was not withdrawn" live>{withdraw.error.message}</Notice>}
          <TextArea id="withdraw-note" label="Why, for the record" rows={2} maxLength={2000} value={note} onChange={(event) => setNote(event.target.value)} />
        </div>
      </DialogBox>
    </>
  );
}
