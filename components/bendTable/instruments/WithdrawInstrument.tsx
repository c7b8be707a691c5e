"use client";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { TextInput } from "@/components/ui/TextInput";
import { useToast } from "@/components/ui/ToastProvider";
import { useWithdrawInstrument } from "@/lib/queries/bendTable";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";

export function WithdrawInstrument({ instrument, onClose }: { readonly instrument: InstrumentView; readonly onClose: () => void }) {
  const toast = useToast();
  const withdraw = useWithdrawInstrument();
  const [reason, setReason] = useState("");
  const [tried, setTried] = useState(false);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (reason.trim() === "") { document.getElementById("withdraw-reason")?.focus(); return; }
    withdraw.mutate({ id: instrument.id, reason: reason.trim() }, { onSuccess: () => { toast("good", `${instrument.name} withdrawn`); onClose(); } });
  };
  return (
    <DialogBox open onOpenChange={onClose} title={`Withdraw ${instrument.name}`} description="It can no longer be chosen. Trials that were measured with it keep it and its limit of error."
      actions={<><Button look="plain" onClick={onClose}>Cancel</Button><Button type="submit" form="withdraw-instrument" look="danger" busy={withdraw.isPending}>Withdraw</Button></>}>
      <form id="withdraw-instrument" noValidate onSubmit={submit} className="space-y-4">
        {withdraw.error === null ? null : <Notice tone="wrong" title="Nothing was changed" live>{withdraw.error.message}</Notice>}
        <TextInput id="withdraw-reason" label="Reason" maxLength={500} value={reason} onChange={(event) => setReason(event.target.value)} error={tried && reason.trim() === "" ? "Say why: lost, broken, out of calibration." : undefined} />
      </form>
    </DialogBox>
  );
}
