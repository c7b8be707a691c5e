"use client";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/Button";
import { DialogBox } from "@/components/ui/DialogBox";
import { Notice } from "@/components/ui/Notice";
import { TextArea } from "@/components/ui/TextArea";
import { useToast } from "@/components/ui/ToastProvider";
import { useJudgeTrial } from "@/lib/queries/bendTable";
import type { TrialView } from "@/lib/schemas/bendTableViews";

interface JudgeDialogProps {
  readonly trial: TrialView;
  readonly to: "excluded" | "withdrawn";
  readonly onDone: () => void;
  readonly onClose: () => void;
}

const words = {
  excluded: { title: "Exclude", button: "Exclude it", done: "excluded", why: "It stays on record and in sight, does not count in the value, and can be brought back." },
  withdrawn: { title: "Withdraw", button: "Withdraw it for good", done: "withdrawn", why: "For a trial that was never true: a slip of the pen, a wrong strip. It leaves the value for good and stays only in the list of trials." },
} as const;

/** Asks why, and excludes a trial from its value or withdraws it. */
export function JudgeDialog({ trial, to, onDone, onClose }: JudgeDialogProps) {
  const toast = useToast();
  const judge = useJudgeTrial();
  const [reason, setReason] = useState("");
  const [tried, setTried] = useState(false);
  const say = words[to];
  const wrong = tried && reason.trim() === "" ? "Say why, for whoever looks at this value later." : reason.trim().length > 500 ? "At most 500 characters." : undefined;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (reason.trim() === "" || reason.trim().length > 500) { document.getElementById("judge-reason")?.focus(); return; }
    judge.mutate({ id: trial.id, state: to, reason: reason.trim() }, { onSuccess: () => { toast("good", `${trial.number} ${say.done}`, reason.trim()); onDone(); onClose(); } });
  };
  return (
    <DialogBox open onOpenChange={onClose} title={`${say.title} ${trial.number}`} description={say.why}
      actions={<><Button look="plain" onClick={onClose}>Cancel</Button><Button type="submit" form="judge" look={to === "withdrawn" ? "danger" : "primary"} busy={judge.isPending}>{say.button}</Button></>}>
      <form id="judge" noValidate onSubmit={submit} className="space-y-4">
        {judge.error === null ? null : <Notice tone="wrong" title="Nothing was changed" live>{judge.error.message}</Notice>}
        <TextArea id="judge-reason" label="Reason" rows={3} value={reason} onChange={(event) => setReason(event.target.value)} error={wrong} />
      </form>
    </DialogBox>
  );
}
